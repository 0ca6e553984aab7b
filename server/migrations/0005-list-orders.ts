/**
 * An index for each order of the register, site by site, and lengths fine enough for inches: 1/32 in is 0.79375 mm.
 */
export const name = '0005-list-orders';

export const up = [
  `ALTER TABLE slings
    ADD COLUMN due_sort_on DATE AS (COALESCE(next_due_on, DATE '9999-12-31')) PERSISTENT,
    MODIFY COLUMN reach_mm DECIMAL(13,5) NOT NULL,
    DROP KEY slings_site_due,
    ADD KEY slings_site_due (site_id, due_sort_on),
    ADD KEY slings_site_since (site_id, state_since),
    ADD KEY slings_site (site_id)`,
  `ALTER TABLE sling_fittings
    MODIFY COLUMN size_mm DECIMAL(13,5) NULL,
    MODIFY COLUMN throat_mm DECIMAL(13,5) NULL`,
];
