import type { ReactNode } from 'react';
import type { Role } from '../../shared/domain/access/roles';
import { paths } from '../config/paths';

export interface NavItem {
  to: string;
  label: string;
  drawing: ReactNode;
  /** Only for people with one of these roles; everybody when absent. */
  roles?: readonly Role[];
}

const LINE = {
  fill: 'none',
  stroke: 'currentColor',
  strokeWidth: 1.9,
  strokeLinecap: 'round',
  strokeLinejoin: 'round',
} as const;

const slings = (
  <svg viewBox="0 0 28 28" aria-hidden="true" {...LINE}>
    <circle cx="14" cy="5.2" r="2.6" />
    <path d="M12.600 7.600 6 18.500M15.400 7.600 22 18.500" strokeDasharray="2.800 2.400" />
    <path d="M6 18.500v2a2.700 2.700 0 1 0 2.900 2.600M22 18.500v2a2.700 2.700 0 1 1-2.900 2.600" />
  </svg>
);
const cage = (
  <svg viewBox="0 0 28 28" aria-hidden="true" {...LINE}>
    <path d="M4.500 24V8.500L14 4l9.500 4.500V24ZM9.300 7v17M18.700 7v17M14 4v20M4.500 14h19" />
  </svg>
);
const labels = (
  <svg viewBox="0 0 28 28" aria-hidden="true" {...LINE}>
    <path d="M9.500 6.500h15v15h-15L3.500 14Z" />
    <circle cx="9.600" cy="14" r="1.600" />
    <path d="M14.500 11h2.500v2.500h-2.500zM19.500 11h1.500M20.500 14.500v2.500M14.500 17h2.500" />
  </svg>
);
const account = (
  <svg viewBox="0 0 28 28" aria-hidden="true" {...LINE}>
    <path d="M6 18.500c0-5 3-9.500 8-9.500s8 4.500 8 9.500ZM3.500 18.500h21M12 9V6.500h4V9M9 22.500h10" />
  </svg>
);
const users = (
  <svg viewBox="0 0 28 28" aria-hidden="true" {...LINE}>
    <circle cx="10" cy="9.500" r="3.600" />
    <path d="M3.500 22.500c.4-5 2.900-7.300 6.500-7.300s6.100 2.300 6.500 7.300M18 6.500a3.600 3.600 0 0 1 0 6.500M19.500 15.800c3 .6 4.700 2.900 5 6.700" />
  </svg>
);

const sites = (
  <svg viewBox="0 0 28 28" aria-hidden="true" {...LINE}>
    <path d="M3.5 23.5V12L10 8v4l6.500-4v4L23 8v15.500ZM3.500 23.500h21" />
    <path d="M8 16.500h2M13 16.500h2M18 16.500h2M11 23.500V20h5v3.500" />
  </svg>
);

/** The corners of a label in a viewfinder; stands in the scan button. */
export const scanDrawing = (
  <svg viewBox="0 0 28 28" aria-hidden="true" {...LINE} strokeWidth="2.200">
    <path d="M4 9.500V4h5.500M18.500 4H24v5.500M24 18.500V24h-5.500M9.500 24H4v-5.500" />
    <path d="M9 9h4v4H9zM16.500 9H19v2.500M9 16.500h2.500V19M15.500 15.500H19V19" />
  </svg>
);

/** Left and right of Scan on the phone; the rail shows all. On a phone the account page leads to the rest. */
export const NAV_ITEMS: {
  left: readonly NavItem[];
  right: readonly NavItem[];
  railOnly: readonly NavItem[];
} = {
  left: [
    { to: paths.slings(), label: 'Slings', drawing: slings },
    { to: paths.cage, label: 'Cage', drawing: cage },
  ],
  right: [
    { to: paths.labels, label: 'Labels', drawing: labels },
    { to: paths.account, label: 'Account', drawing: account },
  ],
  railOnly: [
    { to: paths.users, label: 'Users', drawing: users, roles: ['admin'] },
    { to: paths.sites, label: 'Sites', drawing: sites, roles: ['admin'] },
  ],
};
