'use client';

import { useMemo } from 'react';
import { Dialog } from '@/components/ui/dialog';
import { midHeight, requiredSpeed } from '@/lib/engine';
import { type Emitter, requiredDose, type StopSet, toEngineEmitter } from '@/lib/room';
import { toMillijoulesPerCm2 } from '@/lib/units';

/** Metres from the emitter's mark to the surface beside its path. */
const standOffs = [0.3, 0.5, 0.75, 1, 1.25, 1.5, 2] as const;

/** How fast the emitter may be pushed past an upright surface that is to get its dose: the further off, the slower. */
export function SpeedTable({
  emitter,
  set,
  onClose,
}: {
  emitter: Emitter;
  set: StopSet;
  onClose: () => void;
}) {
  const target = requiredDose(set);
  const lamp = useMemo(() => toEngineEmitter(emitter), [emitter]);
  const speeds = useMemo(() => requiredSpeed(lamp, standOffs, target), [lamp, target]);
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={`Push speeds: ${emitter.name}`}
      description={`The greatest speed at which one long straight pass gives ${Number(
        toMillijoulesPerCm2(target).toPrecision(3),
      )} mJ/cm² to an upright surface beside the path, ${midHeight(lamp).toFixed(2)} m up.`}
    >
      <table className="w-full">
        <thead>
          <tr className="border-b text-left font-condensed text-sm text-ink-2">
            <th className="py-1.5 font-medium">Stand-off</th>
            <th className="py-1.5 text-right font-medium">Speed</th>
            <th className="py-1.5 text-right font-medium">One metre takes</th>
          </tr>
        </thead>
        <tbody>
          {standOffs.map((metres, i) => (
            <tr key={metres} className="border-b">
              <td className="mono py-1.5">{metres.toFixed(2)} m</td>
              <td className="mono py-1.5 text-right">{speeds[i].toFixed(4)} m/s</td>
              <td className="mono py-1.5 text-right">{(1 / speeds[i]).toFixed(1)} s</td>
            </tr>
          ))}
        </tbody>
      </table>
      <p className="mt-3 text-sm text-ink-2">
        Direct light, nothing in between, warm-up over. Whoever pushes stays out of the lit room: only remote
        or guarded emitters are pushed lit. Follow the emitter’s manual.
      </p>
    </Dialog>
  );
}
