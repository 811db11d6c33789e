import type { ComponentPropsWithRef } from 'react';

type ButtonLook = 'plain' | 'primary' | 'quiet' | 'danger';

const looks: Record<ButtonLook, string> = {
  plain: 'btn',
  primary: 'btn btn-primary',
  quiet: 'btn btn-quiet',
  danger: 'btn btn-danger',
};

/** Class names of a button, for links that look like one. */
export function buttonClass(look: ButtonLook = 'plain'): string {
  return looks[look];
}

interface ButtonProps extends ComponentPropsWithRef<'button'> {
  look?: ButtonLook;
  /** While a request runs: the words to show, and a second press does nothing. */
  busy?: string | false;
}

/** A button. It stays focusable while busy, so that a reader hears what it is doing. */
export function Button({
  look = 'plain',
  busy = false,
  className,
  children,
  onClick,
  type = 'button',
  ...rest
}: ButtonProps) {
  return (
    <button
      {...rest}
      type={busy ? 'button' : type}
      className={className ? `${looks[look]} ${className}` : looks[look]}
      aria-disabled={busy ? true : rest['aria-disabled']}
      onClick={busy ? undefined : onClick}
    >
      {busy || children}
    </button>
  );
}
