import { describe, expect, it } from 'vitest';
import { LABEL_STOCKS, labelsPerPage } from '../../../../labels/stocks';
import { countColumns, countSheets, planFirstSheet } from '../../../../src/features/labels/sheetShape';

describe('the drawn sheet', () => {
  it.each(LABEL_STOCKS.filter((stock) => stock.sheet))('has the columns of $id', (stock) => {
    const drawn = countColumns({ perSheet: labelsPerPage(stock), widthMm: stock.widthMm });
    expect(drawn).toBe(stock.sheet?.columns);
  });

  it('marks what is used, what is printed now and what stays free', () => {
    expect(planFirstSheet(6, 3, 2)).toEqual(['used', 'used', 'now', 'now', 'free', 'free']);
    expect(planFirstSheet(3, 2, 9)).toEqual(['used', 'now', 'now']);
  });

  it('counts the part-used sheet among the sheets', () => {
    expect(countSheets(24, 1, 24)).toBe(1);
    expect(countSheets(24, 24, 2)).toBe(2);
  });
});
