import { useId, type ReactNode } from 'react';

/** A part of the form: what it is about on the left, its fields on the right; above each other where it is narrow. */
export function FormSection({
  title,
  about,
  children,
}: {
  title: string;
  about?: ReactNode;
  children: ReactNode;
}): ReactNode {
  const id = useId();
  return (
    <section
      aria-labelledby={id}
      className="grid gap-x-8 gap-y-4 border-t-2 border-ink py-5 lg:grid-cols-[15rem_minmax(0,1fr)]"
    >
      <div>
        <h2 id={id} className="text-lg font-bold">
          {title}
        </h2>
        {about && <div className="mt-1 max-w-prose text-[0.9375rem] text-muted">{about}</div>}
      </div>
      <div className="flex min-w-0 flex-col gap-5">{children}</div>
    </section>
  );
}

/** Fields side by side where there is room. */
export function FieldRow({ children, columns = 2 }: { children: ReactNode; columns?: 2 | 3 }): ReactNode {
  return (
    <div
      className={
        columns === 3
          ? 'grid items-start gap-x-4 gap-y-5 sm:grid-cols-2 xl:grid-cols-3'
          : 'grid items-start gap-x-4 gap-y-5 sm:grid-cols-2'
      }
    >
      {children}
    </div>
  );
}
