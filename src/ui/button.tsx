import type { ComponentProps } from 'react';

type Kind = 'primary' | 'plain' | 'quiet';

const looks: Record<Kind, string> = {
  primary: 'bg-brass text-on-brass font-semibold border-transparent',
  plain: 'bg-paper text-ink border-rule',
  quiet: 'bg-transparent text-brass border-transparent',
};

type ButtonProps = ComponentProps<'button'> & { readonly kind?: Kind };

export const Button = ({ kind = 'plain', className = '', ...rest }: ButtonProps) => (
  <button
    type="button"
    className={`inline-flex min-h-10 items-center justify-center gap-2 rounded-one border px-4 disabled:opacity-60 ${looks[kind]} ${className}`}
    {...rest}
  />
);
