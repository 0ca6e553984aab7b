import type { Fault } from '../../form/faults';

export interface LocatedFault extends Fault {
  /** The words over the field: the form's own, so that they never differ. */
  label: string;
}

/** The faults in the order of the page, each with its field's label ("Fitting 2, Size"). */
export function locateFaults(faults: readonly Fault[]): LocatedFault[] {
  return faults
    .map((fault) => ({ fault, control: document.getElementsByName(fault.path).item(0) }))
    .toSorted((a, b) => comparePlaces(a.control, b.control))
    .map(({ fault, control }) => ({ ...fault, label: control ? nameField(control) : 'This form' }));
}

function comparePlaces(a: HTMLElement | null, b: HTMLElement | null): number {
  if (!a || !b || a === b) return Number(a === null) - Number(b === null);
  return a.compareDocumentPosition(b) & Node.DOCUMENT_POSITION_FOLLOWING ? -1 : 1;
}

function nameField(control: HTMLElement): string {
  const group = control.closest<HTMLElement>('[data-group]')?.dataset.group;
  return [group, findLabel(control)].filter(Boolean).join(', ');
}

function findLabel(control: HTMLElement): string {
  if (control instanceof HTMLInputElement && control.type === 'radio') {
    return control.closest('fieldset')?.querySelector('legend')?.textContent ?? '';
  }
  const isLabelled =
    control instanceof HTMLInputElement ||
    control instanceof HTMLSelectElement ||
    control instanceof HTMLTextAreaElement;
  // The first text alone: "(may stay empty)" follows it
  return (isLabelled && control.labels?.item(0)?.firstChild?.textContent) || '';
}
