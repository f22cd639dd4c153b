'use client';

import { X } from 'lucide-react';
import { useEffect, useMemo, useRef } from 'react';
import { IconButton } from '@/components/ui/icon-button';
import { doseImage } from '@/lib/drawing/dose-image';
import { formatRatio } from '@/lib/drawing/dose-scale';
import { hatchLines } from '@/lib/drawing/hatch';
import type { SideStrip } from '@/lib/engine';
import { formatMetres } from '@/lib/units';

/** An upright face laid flat: its length across, its height up, seen from in front. */
export function UnrolledFace({
  name,
  strip,
  ratio,
  onClose,
}: {
  name: string;
  strip: SideStrip;
  /** Dose ÷ target of its own cells. */
  ratio: Float32Array;
  onClose: () => void;
}) {
  const canvas = useRef<HTMLCanvasElement>(null);
  const { columns, rows, mask } = strip;
  useEffect(() => {
    const context = canvas.current?.getContext('2d');
    context?.putImageData(new ImageData(doseImage({ columns, rows, mask }, ratio), columns, rows), 0, 0);
  }, [columns, rows, mask, ratio]);
  const hatch = useMemo(
    () =>
      hatchLines(
        { originX: 0, originY: 0, step: 1, columns, rows, mask },
        (cell) => ratio[cell] < 1,
        Math.max(2, columns / 40),
      ),
    [columns, rows, mask, ratio],
  );
  const counted = [...ratio].filter((_, cell) => mask[cell] === 1);
  const met = counted.filter((value) => value >= 1).length;
  const length = columns * strip.cellWidth;
  // At most as tall as a palm, and never thinner than a finger.
  const proportion = Math.max(0.12, Math.min(0.7, (strip.top - strip.base) / length));
  return (
    <section aria-label={`${name}, unrolled`} className="rounded border border-rule bg-desk/60 p-3">
      <div className="flex items-start justify-between gap-2">
        <div>
          <h3 className="font-semibold">{name}</h3>
          <p className="text-sm text-ink-2">
            {formatMetres(length)} long, {strip.base.toFixed(2)} to {strip.top.toFixed(2)} m high ·{' '}
            {counted.length === 0 ? '–' : `${Math.floor((met / counted.length) * 1000) / 10}% met`} · lowest{' '}
            {formatRatio(counted.length === 0 ? 0 : Math.min(...counted))}
          </p>
        </div>
        <IconButton label="Roll it up" icon={<X size={16} aria-hidden />} onClick={onClose} />
      </div>
      <div
        className="relative mt-2 w-full border border-rule bg-[#fcfbf7]"
        style={{ aspectRatio: 1 / proportion }}
      >
        {/* Row 0 is at the foot of the face. */}
        <canvas
          ref={canvas}
          width={columns}
          height={rows}
          className="absolute inset-0 size-full -scale-y-100 [image-rendering:pixelated]"
        />
        <svg
          aria-hidden="true"
          viewBox={`0 0 ${columns} ${rows}`}
          preserveAspectRatio="none"
          className="absolute inset-0 size-full -scale-y-100"
        >
          <path
            d={hatch
              .reduce<string[]>((parts, _, i) => {
                if (i % 4 === 0) parts.push(`M${hatch[i]} ${hatch[i + 1]}L${hatch[i + 2]} ${hatch[i + 3]}`);
                return parts;
              }, [])
              .join('')}
            stroke="#5a2f08"
            strokeWidth={1}
            opacity={0.75}
            vectorEffect="non-scaling-stroke"
          />
        </svg>
      </div>
    </section>
  );
}
