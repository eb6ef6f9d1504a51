import type { ReactElement } from 'react';
import { subjectLabels } from '../../blocks/words.ts';
import { TextField } from '../../ui/field.tsx';
import { addressProblem } from './address-problem.ts';
import type { EditorStart } from './editor-start.ts';

interface AddressFieldProps {
  readonly start: EditorStart;
  readonly value: string;
  readonly onChange: (value: string) => void;
  /** The addresses that stand beside it already. */
  readonly taken: readonly string[];
  /** What the book said of it. */
  readonly problem: string | undefined;
}

/** Where a new subject or page will stand: made from its title until somebody writes another. */
export function AddressField({ start, value, onChange, taken, problem }: AddressFieldProps): ReactElement {
  const { shelf, subject } = start;
  const isSubject = subject === null;
  const before = isSubject ? `/${shelf}/` : `/${shelf}/${subject}/`;
  const wrong = addressProblem(value, taken, isSubject ? subjectLabels[shelf].toLowerCase() : 'page');
  return (
    <TextField
      label="Address"
      hint={
        <>
          It will stand at <b className="address-path">{value === '' ? `${before}…` : before + value}</b>. Made from the
          title in the text; write another if that one will not do.
        </>
      }
      name={isSubject ? 'subject' : 'page'}
      value={value}
      onChange={(event) => onChange(event.currentTarget.value)}
      autoComplete="off"
      autoCapitalize="none"
      spellCheck={false}
      problem={wrong ?? problem}
    />
  );
}
