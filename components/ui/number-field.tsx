'use client';

import { useEffect, useState } from 'react';
import { TextField } from './field';

/** A number typed by hand: taken on Enter or on leaving the field; what cannot be used stays, marked with why. */
export function NumberField({
  label,
  unit,
  value,
  digits = 2,
  min = Number.NEGATIVE_INFINITY,
  max = Number.POSITIVE_INFINITY,
  disabled,
  hint,
  onChange,
}: {
  label: string;
  unit?: string;
  value: number;
  digits?: number;
  min?: number;
  max?: number;
  disabled?: boolean;
  hint?: string;
  onChange: (value: number) => void;
}) {
  const shown = String(Number(value.toFixed(digits)));
  const [text, setText] = useState(shown);
  const [error, setError] = useState<string | null>(null);

  useEffect(() => {
    setText(shown);
    setError(null);
  }, [shown]);

  const commit = () => {
    const parsed = Number(text.trim().replace(',', '.'));
    if (text.trim() === '' || !Number.isFinite(parsed)) setError('Write a number');
    else if (parsed < min) setError(`At least ${min}${unit ? ` ${unit}` : ''}`);
    else if (parsed > max) setError(`At most ${max}${unit ? ` ${unit}` : ''}`);
    else {
      setError(null);
      setText(String(parsed));
      if (text !== shown) onChange(parsed);
    }
  };

  return (
    <TextField
      label={label}
      unit={unit}
      inputMode="decimal"
      value={text}
      error={error}
      hint={hint}
      disabled={disabled}
      onChange={(event) => setText(event.target.value)}
      onBlur={commit}
      onKeyDown={(event) => {
        if (event.key === 'Enter') commit();
        if (event.key === 'Escape') {
          setText(shown);
          setError(null);
        }
      }}
    />
  );
}
