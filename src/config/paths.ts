/** Every address in the client, in one place. Ids and codes are encoded here. */
const enc = (part: string | number): string => encodeURIComponent(String(part));

export const paths = {
  home: '/',
  signIn: (returnTo?: string): string =>
    returnTo && returnTo !== '/' ? `/sign-in?to=${encodeURIComponent(returnTo)}` : '/sign-in',
  setUp: '/set-up',
  invitation: (token: string): string => `/invitation/${enc(token)}`,
  account: '/account',
  users: '/users',
  sites: '/sites',
  slings: (query = ''): string => `/slings${query ? `?${query}` : ''}`,
  newSling: '/slings/new',
  sling: (id: number | string): string => `/slings/${enc(id)}`,
  hold: (id: number | string): string => `/slings/${enc(id)}/hold`,
  inspect: (id: number | string): string => `/slings/${enc(id)}/inspect`,
  act: (id: number | string, action: string): string => `/slings/${enc(id)}/do/${enc(action)}`,
  ledger: (id: number | string): string => `/slings/${enc(id)}/ledger`,
  cage: '/cage',
  labels: '/labels',
  labelsFor: (slingIds: readonly (number | string)[]): string =>
    `/labels?slings=${slingIds.map(enc).join(',')}`,
  labelRun: (id: number | string): string => `/labels/${enc(id)}`,
  printerTest: '/printer-test',
  scan: (code?: string): string => (code ? `/scan?code=${enc(code)}` : '/scan'),
  publicTag: (code: string): string => `/t/${enc(code)}`,
} as const;

/** Where the API serves a stored file. */
export const fileUrl = (id: number | string): string => `/api/files/${enc(id)}`;
