import { useEffect, useId, useRef, type ReactNode } from 'react';

export interface DialogProps {
  open: boolean;
  /** Escape, the close button, or a press outside. */
  onClose: () => void;
  title: string;
  children: ReactNode;
  /** Buttons; the main one last. */
  footer?: ReactNode;
}

/** A modal question in the browser's own dialog: focus stays inside and goes back to where it was. */
export function Dialog({ open, onClose, title, children, footer }: DialogProps): ReactNode {
  const ref = useRef<HTMLDialogElement>(null);
  const id = useId();
  useEffect(() => {
    const dialog = ref.current;
    if (!dialog) return;
    if (open && !dialog.open) dialog.showModal();
    if (!open && dialog.open) dialog.close();
  }, [open]);
  return (
    <dialog
      ref={ref}
      aria-labelledby={id}
      onClose={onClose}
      onClick={(event) => {
        if (event.target === ref.current) onClose();
      }}
      className="m-auto w-[min(34rem,calc(100vw-2rem))] max-w-none rounded-lg border border-rule bg-card p-0 text-ink shadow-xl max-sm:mb-4"
    >
      {open && (
        <div className="flex max-h-[85dvh] flex-col">
          <header className="flex items-start justify-between gap-3 px-5 pt-4 pb-2">
            <h2 id={id} className="text-xl font-bold">
              {title}
            </h2>
            <button
              type="button"
              onClick={onClose}
              aria-label="Close"
              className="-mt-2 -mr-3 grid size-12 shrink-0 place-items-center rounded text-muted hover:bg-wash"
            >
              <svg viewBox="0 0 24 24" className="size-6" aria-hidden="true">
                <path d="M6 6 18 18M18 6 6 18" stroke="currentColor" strokeWidth="2.2" />
              </svg>
            </button>
          </header>
          <div className="flex-1 overflow-y-auto px-5 pb-4">{children}</div>
          {footer && (
            <footer className="flex flex-wrap justify-end gap-3 border-t border-rule px-5 py-4">
              {footer}
            </footer>
          )}
        </div>
      )}
    </dialog>
  );
}
