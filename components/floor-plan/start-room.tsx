'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/field';
import type { Outcome } from '@/lib/editor/outcome';
import { DEFAULT_CEILING, drawRectangle } from '@/lib/editor/outline-actions';

const metres = (text: string): number => (text.trim() === '' ? Number.NaN : Number(text.replace(',', '.')));

const wrong = (value: number, least: number, most: number): string | null =>
  Number.isFinite(value) && value >= least && value <= most ? null : `Between ${least} and ${most} m`;

/** A room that is not drawn yet: type its measures, or draw it on the sheet. */
export function StartRoom({ onDraw }: { onDraw: (outcome: Outcome) => void }) {
  const [text, setText] = useState({ width: '', depth: '', ceiling: String(DEFAULT_CEILING) });
  const [tried, setTried] = useState(false);
  const width = metres(text.width);
  const depth = metres(text.depth);
  const ceiling = metres(text.ceiling);
  const errors = {
    width: wrong(width, 0.5, 200),
    depth: wrong(depth, 0.5, 200),
    ceiling: wrong(ceiling, 1.5, 20),
  };
  const field = (key: keyof typeof text) => ({
    value: text[key],
    unit: 'm',
    inputMode: 'decimal' as const,
    error: tried ? errors[key] : null,
    onChange: (event: { target: { value: string } }) => setText({ ...text, [key]: event.target.value }),
  });
  return (
    <section aria-labelledby="start-heading">
      <h2 id="start-heading" className="font-condensed text-2xl font-semibold">
        Draw the room
      </h2>
      <p className="mt-1 text-ink-2">
        Type its measures between the walls, or draw it on the sheet: drag a rectangle, or click corner by
        corner.
      </p>
      <form
        className="mt-4 grid grid-cols-2 gap-3"
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          setTried(true);
          if (!errors.width && !errors.depth && !errors.ceiling)
            onDraw(drawRectangle(null, width, depth, ceiling));
        }}
      >
        <TextField label="Width" {...field('width')} />
        <TextField label="Depth" {...field('depth')} />
        <TextField label="Ceiling" {...field('ceiling')} />
        <div className="col-span-2">
          <Button variant="primary" type="submit">
            Draw a rectangle
          </Button>
        </div>
      </form>
    </section>
  );
}
