import type { ComponentProps } from 'react';

type Kind = 'primary' | 'plain' | 'quiet';

const looks: Record<Kind, string> = {
  primary: 'bg-brass text-on-brass font-semibold border-transparent',
  plain: 'bg-paper text-ink border-rule',
  quiet: 'bg-transparent text-brass border-transparent',
};

type ButtonProps = ComponentProps<'button'> & {
  readonly kind?: Kind;
  /** Among others in a row, with less room about its word. */
  readonly slim?: boolean;
};

export const Button = ({ kind = 'plain', slim = false, className = '', ...rest }: ButtonProps) => (
  <button
    type="button"
    className={`inline-flex items-center justify-center gap-2 rounded-one border disabled:opacity-60 ${slim ? 'min-h-9 px-2 whitespace-nowrap' : 'min-h-10 px-4'} ${looks[kind]} ${className}`}
    {...rest}
  />
);
