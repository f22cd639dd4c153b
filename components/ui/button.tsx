import type { ButtonHTMLAttributes, ReactNode } from 'react';

export type ButtonVariant = 'primary' | 'secondary' | 'quiet' | 'danger';

const looks: Record<ButtonVariant, string> = {
  primary: 'bg-action text-on-action border border-action hover:opacity-90',
  secondary: 'bg-sheet/0 text-ink border border-ink-2 hover:bg-wash',
  quiet: 'text-link border border-transparent hover:underline underline-offset-4',
  danger: 'text-danger border border-danger hover:bg-danger-wash',
};

export interface ButtonProps extends ButtonHTMLAttributes<HTMLButtonElement> {
  variant?: ButtonVariant;
  size?: 'small' | 'normal';
  icon?: ReactNode;
}

export const buttonClass = (variant: ButtonVariant = 'secondary', size: 'small' | 'normal' = 'normal') =>
  `inline-flex items-center justify-center gap-2 rounded font-medium whitespace-nowrap disabled:opacity-45 ${
    size === 'small' ? 'h-8 px-2.5 text-sm' : 'h-9 px-3.5'
  } ${looks[variant]}`;

export function Button({
  variant = 'secondary',
  size = 'normal',
  icon,
  className = '',
  children,
  ...rest
}: ButtonProps) {
  return (
    <button type="button" className={`${buttonClass(variant, size)} ${className}`} {...rest}>
      {icon}
      {children}
    </button>
  );
}
