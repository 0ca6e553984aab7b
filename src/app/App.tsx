import { QueryClientProvider } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { RouterProvider } from 'react-router-dom';
import { queryClient } from '../lib/queryClient';
import { ErrorBoundary } from './ErrorBoundary';
import { router } from './router';

export function App(): ReactNode {
  return (
    <ErrorBoundary>
      <QueryClientProvider client={queryClient}>
        <RouterProvider router={router} />
      </QueryClientProvider>
    </ErrorBoundary>
  );
}
