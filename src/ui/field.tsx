import {
  useId,
  type InputHTMLAttributes,
  type ReactElement,
  type ReactNode,
  type RefAttributes,
  type SelectHTMLAttributes,
  type TextareaHTMLAttributes,
} from 'react';
import { classNames } from './class-names.ts';

interface FieldText {
  readonly label: string;
  /** What helps to fill it in, under the label. */
  readonly hint?: ReactNode;
  /** What is wrong with it, in a sentence; the text typed stays. */
  readonly problem?: string | undefined;
}

interface Described {
  readonly id: string;
  readonly 'aria-describedby': string | undefined;
  readonly 'aria-invalid': true | undefined;
}

function useField({ label, hint, problem }: FieldText, className: string | undefined) {
  const id = useId();
  const describedBy = [hint === undefined ? '' : `${id}-hint`, problem === undefined ? '' : `${id}-problem`]
    .filter((part) => part !== '')
    .join(' ');
  const described: Described = {
    id,
    'aria-describedby': describedBy === '' ? undefined : describedBy,
    'aria-invalid': problem === undefined ? undefined : true,
  };
  function frame(control: ReactNode): ReactElement {
    return (
      <div className={classNames('field', className)}>
        <label className="field-label" htmlFor={id}>
          {label}
        </label>
        {hint === undefined ? null : (
          <p className="field-hint" id={`${id}-hint`}>
            {hint}
          </p>
        )}
        {control}
        {problem === undefined ? null : (
          <p className="field-problem" id={`${id}-problem`}>
            {problem}
          </p>
        )}
      </div>
    );
  }
  return { described, frame };
}

/** A field of one line. */
export function TextField({
  label,
  hint,
  problem,
  className,
  ...rest
}: FieldText & InputHTMLAttributes<HTMLInputElement> & RefAttributes<HTMLInputElement>): ReactElement {
  const { described, frame } = useField({ label, hint, ...(problem === undefined ? {} : { problem }) }, className);
  return frame(<input type="text" className="field-control" {...rest} {...described} />);
}

/** A field of several lines. */
export function TextArea({
  label,
  hint,
  problem,
  className,
  ...rest
}: FieldText & TextareaHTMLAttributes<HTMLTextAreaElement> & RefAttributes<HTMLTextAreaElement>): ReactElement {
  const { described, frame } = useField({ label, hint, ...(problem === undefined ? {} : { problem }) }, className);
  return frame(<textarea className="field-control" {...rest} {...described} />);
}

/** A choice from a list. */
export function SelectField({
  label,
  hint,
  problem,
  className,
  children,
  ...rest
}: FieldText & SelectHTMLAttributes<HTMLSelectElement>): ReactElement {
  const { described, frame } = useField({ label, hint, ...(problem === undefined ? {} : { problem }) }, className);
  return frame(
    <select className="field-control" {...rest} {...described}>
      {children}
    </select>,
  );
}
