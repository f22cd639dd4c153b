import type { DosePicture } from '@/components/hooks/dose-session';
import type { Times } from '@/lib/room';
import { formatDuration } from '@/lib/units';

/** Target met and lamp-on time: the biggest type on the page. */
export function Verdict({
  picture,
  times,
  stops,
  passes,
  surfaceName,
}: {
  picture: DosePicture | null;
  times: Times;
  stops: number;
  passes: number;
  surfaceName: string;
}) {
  // Rounded down: 99.96 % is not "100 %" while a cell is still under target.
  const share = picture ? Math.floor(picture.coverage.share * 1000) / 10 : null;
  return (
    <div className="grid grid-cols-2 gap-4 border-b pb-5">
      <div>
        <p className="label">Target met</p>
        <p className="figure mt-2" data-figure="target-met">
          {share === null ? '–' : `${share.toFixed(1)}%`}
        </p>
        <p>of {surfaceName}</p>
      </div>
      <div>
        <p className="label">Lamp-on time</p>
        <p className="figure mt-2" data-figure="lamp-on">
          {formatDuration(times.lampOn)}
        </p>
        <p>
          + {formatDuration(times.moving)} moving, {stops} {stops === 1 ? 'stop' : 'stops'}
          {passes > 0 ? `, ${passes} ${passes === 1 ? 'pass' : 'passes'}` : ''}
        </p>
      </div>
    </div>
  );
}
