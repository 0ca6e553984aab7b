import type { ReactNode } from 'react';
import { Skeleton } from '../../../../components/ui/states';

/** Plate, band and panels in their final places. */
export function RecordSkeleton(): ReactNode {
  return (
    <div role="status" className="pt-12">
      <span className="sr-only">Loading the record</span>
      <div className="grid gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,1fr)_21rem]">
        <div className="flex flex-col gap-6">
          <div>
            <Skeleton className="h-40 rounded-b-none" />
            <Skeleton className="h-28 rounded-t-none" />
          </div>
          <Skeleton className="h-32" />
          <Skeleton className="h-48" />
        </div>
        <Skeleton className="h-80" />
      </div>
    </div>
  );
}
