import type { ButtonHTMLAttributes, ReactNode, Ref } from 'react';
import './button.css';

/** `primary` once a screen; `outline` beside it; `quiet` for small acts; `danger` where something is removed. */
export type ButtonLook = 'primary' | 'outline' | 'quiet' | 'danger';

type ButtonProps = Omit<ButtonHTMLAttributes<HTMLButtonElement>, 'className'> & {
  readonly look?: ButtonLook;
  /** Fills the width, 58 px high: the one act of a screen. */
  readonly wide?: boolean;
  /** While an act runs: keeps the place, says so to screen readers, takes no second tap. */
  readonly busy?: boolean;
  readonly children: ReactNode;
  readonly ref?: Ref<HTMLButtonElement>;
};

/** A button of at least 48 px. `type` is `button` unless said otherwise, so that none sends a form by accident. */
export function Button({
  look = 'primary',
  wide = false,
  busy = false,
  disabled,
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      className={buttonClass(look, wide)}
      aria-busy={busy || undefined}
      aria-disabled={busy || undefined}
      disabled={disabled}
      onClick={busy ? (event) => event.preventDefault() : onClick}
    />
  );
}

/** The class of a button's look, for links that look alike. */
export function buttonClass(look: ButtonLook, wide: boolean): string {
  return `hm-button hm-button-${look}${wide ? ' hm-button-wide' : ''}`;
}
