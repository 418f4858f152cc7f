import type { ReactNode } from 'react';
import { Link } from 'react-router-dom';
import { buttonClass, type ButtonLook } from './Button';

type ButtonLinkProps = {
  /** A path of `platform/paths`. */
  readonly to: string;
  readonly look?: ButtonLook;
  readonly wide?: boolean;
  readonly children: ReactNode;
};

/** A link to another screen that looks like a button. */
export function ButtonLink({ to, look = 'primary', wide = false, children }: ButtonLinkProps) {
  return (
    <Link to={to} className={buttonClass(look, wide)}>
      {children}
    </Link>
  );
}
