'use client';

import { useEffect, useState } from 'react';
import { TextField } from '@/components/ui/field';
import { MAX_DWELL_SECONDS } from '@/lib/room';
import { formatDuration, parseDuration } from '@/lib/units';

/** A dwell typed as mm:ss (or plain seconds); what cannot be read stays in the field, marked, and changes nothing. */
export function DurationField({
  label,
  seconds,
  onChange,
  disabled,
}: {
  label: string;
  seconds: number;
  onChange: (seconds: number) => void;
  disabled?: boolean;
}) {
  const [text, setText] = useState(formatDuration(seconds));
  const [error, setError] = useState<string | null>(null);

  useEffect(() => {
    setText(formatDuration(seconds));
    setError(null);
  }, [seconds]);

  const commit = () => {
    const parsed = parseDuration(text);
    if (parsed === null) setError('Write minutes and seconds, such as 7:30');
    else if (parsed > MAX_DWELL_SECONDS) setError('A dwell is at most 240:00');
    else {
      setError(null);
      setText(formatDuration(parsed));
      if (parsed !== seconds) onChange(parsed);
    }
  };

  return (
    <TextField
      label={label}
      unit="mm:ss"
      inputMode="numeric"
      value={text}
      error={error}
      disabled={disabled}
      onChange={(event) => setText(event.target.value)}
      onBlur={commit}
      onKeyDown={(event) => {
        if (event.key === 'Enter') commit();
        if (event.key === 'Escape') {
          setText(formatDuration(seconds));
          setError(null);
        }
        if (event.key === 'ArrowUp' || event.key === 'ArrowDown') {
          event.preventDefault();
          const by = (event.shiftKey ? 60 : 5) * (event.key === 'ArrowUp' ? 1 : -1);
          onChange(Math.max(0, Math.min(MAX_DWELL_SECONDS, seconds + by)));
        }
      }}
    />
  );
}
