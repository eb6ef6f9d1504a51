import type { ReactElement } from 'react';
import { FaceChoice } from './face-choice.tsx';

/** What stands under every sheet: whom the book defers to, and the choice of a face. */
export function FootRail(): ReactElement {
  return (
    <footer className="foot-rail">
      <p>
        Members wrote this book from their own bikes. Where it differs from the maker’s manual, from local law or from
        what a licensed trade must do, those count. Measure before you trust a wire.
      </p>
      <FaceChoice />
    </footer>
  );
}
