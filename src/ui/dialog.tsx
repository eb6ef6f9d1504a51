import { useEffect, useId, useRef, type ReactElement, type ReactNode } from 'react';
import { Button } from './button.tsx';

interface DialogProps {
  readonly open: boolean;
  readonly title: string;
  readonly children: ReactNode;
  /** Called for Escape, for the button that leaves, and for a form that closes it. */
  readonly onClose: () => void;
  /** What leaving is called; a verb. */
  readonly closeLabel?: string;
}

/** A plate over the sheet that takes the keyboard until it is left. Only for what nothing else can be done beside. */
export function Dialog({ open, title, children, onClose, closeLabel = 'Leave it' }: DialogProps): ReactElement {
  const element = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = element.current;
    if (dialog === null) return;
    if (open && !dialog.open) dialog.showModal();
    if (!open && dialog.open) dialog.close();
  }, [open]);
  return (
    <dialog className="dialog plate" ref={element} aria-labelledby={titleId} onClose={onClose}>
      <h2 id={titleId}>{title}</h2>
      {children}
      <Button type="button" onClick={onClose}>
        {closeLabel}
      </Button>
    </dialog>
  );
}
