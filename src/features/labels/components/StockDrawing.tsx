import type { ReactNode } from 'react';
import type { LabelStockView } from '../../../../shared/schemas/labels';

/** A roll, a sheet or a single tag, in currentColor. */
export function StockDrawing({ stock }: { stock: Pick<LabelStockView, 'kind'> }): ReactNode {
  return (
    <svg viewBox="0 0 44 44" fill="none" stroke="currentColor" strokeWidth="2" aria-hidden="true">
      {DRAWINGS[stock.kind]}
    </svg>
  );
}

const DRAWINGS: Record<LabelStockView['kind'], ReactNode> = {
  roll: (
    <>
      <circle cx="15" cy="16" r="11" />
      <circle cx="15" cy="16" r="4" />
      <path d="M26 16v14h14v9H15" />
      <path d="M20 33.5h5v3h-5z" fill="currentColor" />
    </>
  ),
  sheet: (
    <>
      <path d="M8 3h28v38H8z" />
      <path d="M8 12.500h28M8 22h28M8 31.500h28M17.300 3v38M26.700 3v38" strokeWidth="1.400" />
    </>
  ),
  single: (
    <>
      <rect x="4" y="11" width="36" height="22" rx="3" />
      <path d="M9 17h9v9H9z" fill="currentColor" />
      <path d="M23 18h12M23 22h12M23 26h7" strokeWidth="1.600" />
    </>
  ),
};
