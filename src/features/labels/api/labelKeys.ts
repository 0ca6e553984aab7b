/** Query keys of this feature; `['slings', …]` so that a change to any sling renews the lists too. */
export const labelKeys = {
  stocks: ['label-stocks'],
  run: (id: number) => ['label-runs', id],
  choosable: (filters: Record<string, string>) => ['slings', 'for-labels', filters],
  sling: (id: number) => ['slings', 'for-labels', 'one', id],
} as const;
