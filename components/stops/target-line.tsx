import { requiredDose, type StopSet } from '@/lib/room';
import { toMillijoulesPerCm2 } from '@/lib/units';

/** What every spot must get, and how that came about. */
export function TargetLine({ set }: { set: StopSet }) {
  const required = toMillijoulesPerCm2(requiredDose(set));
  const target = toMillijoulesPerCm2(set.target.dose);
  return (
    <p className="text-[14.5px]" title={`${set.target.name}. ${set.target.source || 'No source given'}`}>
      Target <strong>{Number(required.toPrecision(4))} mJ/cm²</strong>{' '}
      <span className="text-ink-2">
        · {Number(target.toPrecision(4))} × margin {set.margin}
      </span>
    </p>
  );
}
