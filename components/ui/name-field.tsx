'use client';

import { TextField } from './field';

/** A name, taken on Enter or on leaving the field; an empty one falls back to what it was. */
export function NameField({
  label = 'Name',
  value,
  className,
  disabled,
  onChange,
}: {
  label?: string;
  value: string;
  className?: string;
  disabled?: boolean;
  onChange: (name: string) => void;
}) {
  return (
    <TextField
      label={label}
      className={className}
      defaultValue={value}
      key={value}
      maxLength={80}
      disabled={disabled}
      onBlur={(event) => {
        const name = event.target.value.trim();
        if (name && name !== value) onChange(name);
        else event.target.value = value;
      }}
      onKeyDown={(event) => event.key === 'Enter' && event.currentTarget.blur()}
    />
  );
}
