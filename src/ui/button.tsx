import type { ComponentProps } from 'react';
import { Link, type LinkProps } from 'react-router-dom';
import { joinClassNames } from '../lib/class-names';

type Variant = 'primary' | 'secondary' | 'quiet';
type Look = { variant?: Variant; isSmall?: boolean };

const shared =
  'inline-flex items-center justify-center gap-2 rounded-edge border text-center font-semibold leading-tight ' +
  'select-none disabled:opacity-55 disabled:cursor-not-allowed aria-disabled:opacity-55';
const variants: Record<Variant, string> = {
  primary: 'border-lee bg-lee text-on-lee enabled:hover:bg-ink enabled:hover:border-ink',
  secondary: 'border-edge bg-surface text-ink enabled:hover:border-ink',
  quiet: 'border-transparent text-lee underline underline-offset-4 decoration-1 enabled:hover:decoration-2',
};

const findLook = ({ variant = 'secondary', isSmall = false }: Look, className?: string) =>
  joinClassNames(
    shared,
    variants[variant],
    isSmall ? 'min-h-7 px-2.5 py-0.5 text-sm' : 'min-h-10 px-4 py-1.5 text-base',
    className,
  );

type ButtonProps = ComponentProps<'button'> & Look & { isBusy?: boolean; busyText?: string };

/** A deed. While busy it stays focusable, says so, and ignores further presses. */
export function Button({
  variant,
  isSmall,
  isBusy,
  busyText,
  className,
  children,
  onClick,
  ...rest
}: ButtonProps) {
  return (
    <button
      type="button"
      {...rest}
      className={findLook({ variant, isSmall }, className)}
      aria-disabled={isBusy || undefined}
      onClick={isBusy ? (event) => event.preventDefault() : onClick}
    >
      {isBusy ? (busyText ?? 'One moment …') : children}
    </button>
  );
}

/** A place that looks like a button. */
export const ButtonLink = ({ variant, isSmall, className, ...rest }: LinkProps & Look) => (
  <Link {...rest} className={joinClassNames(findLook({ variant, isSmall }, className), 'hover:border-ink')} />
);
