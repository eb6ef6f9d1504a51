import type { ReactElement } from 'react';
import { Button } from '../ui/button.tsx';
import { PrintSign } from '../ui/signs.tsx';

/** Prints the sheet for the bench; only where scripts run, since browsers have their own way without. */
export function PrintButton(): ReactElement {
  return (
    <Button type="button" className="scripted" onClick={() => window.print()}>
      <PrintSign /> Print for the bench
    </Button>
  );
}
