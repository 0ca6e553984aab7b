import { queryOptions } from '@tanstack/react-query';
import { listOf } from '../../../../shared/schemas/common';
import { labelStockSchema } from '../../../../shared/schemas/labels';
import { api } from '../../../lib/apiClient';
import { labelKeys } from './labelKeys';

export const labelStocksQuery = queryOptions({
  queryKey: labelKeys.stocks,
  queryFn: async ({ signal }) => (await api.get('/label-stocks', listOf(labelStockSchema), { signal })).items,
  staleTime: 600_000,
});
