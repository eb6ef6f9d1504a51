import { useEffect, type RefObject } from 'react';

/** Puts the cursor into the first field of a form that is wrong, whenever the form has been answered. */
export function useFirstProblem(form: RefObject<HTMLFormElement | null>, answer: unknown): void {
  useEffect(() => {
    form.current?.querySelector<HTMLElement>('[aria-invalid="true"]')?.focus();
  }, [form, answer]);
}
