import type { ButtonHTMLAttributes, ReactElement } from 'react';
import { Link, type LinkProps } from 'react-router';
import { classNames } from './class-names.ts';

/** `primary` is the one next step of a sheet, `plain` any other, `grave` what cannot be taken back. */
export type ButtonLook = 'primary' | 'plain' | 'grave';

interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  readonly look?: ButtonLook;
}

/** A button: square, 48 px high, and named with a verb. It sends its form unless `type="button"`. */
export function Button({ look = 'plain', className, type = 'submit', ...rest }: ButtonProps): ReactElement {
  return <button type={type} className={classNames('button', `button-${look}`, className)} {...rest} />;
}

interface ButtonLinkProps extends LinkProps {
  readonly look?: ButtonLook;
}

/** A link that is the next step, and looks like it. */
export function ButtonLink({ look = 'plain', className, ...rest }: ButtonLinkProps): ReactElement {
  return <Link className={classNames('button', `button-${look}`, className)} {...rest} />;
}
