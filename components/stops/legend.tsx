import { doseSteps } from '@/lib/drawing/dose-scale';

/** The six steps of dose ÷ target; those under target are hatched as on the sheet. */
export function Legend() {
  return (
    <div className="flex flex-wrap items-center gap-x-5 gap-y-1.5 text-sm">
      <span className="label">Dose ÷ target</span>
      <ul className="flex flex-wrap gap-x-4 gap-y-1.5">
        {doseSteps.map(({ label, colour, under }) => (
          <li key={label} className="flex items-center gap-1.5 font-condensed font-medium">
            <svg width="26" height="13" aria-hidden="true">
              <rect
                x="0.5"
                y="0.5"
                width="25"
                height="12"
                fill={colour}
                stroke={under ? '#5a2f08' : '#9aa7a5'}
              />
              {under ? (
                <path d="M-2 13 11 0M5 13 18 0M12 13 25 0M19 13 32 0" stroke="#5a2f08" strokeWidth="1" />
              ) : null}
            </svg>
            {label}
          </li>
        ))}
      </ul>
      <span className="ml-auto hidden font-condensed text-ink-2 xl:inline">hatched = under-dosed</span>
    </div>
  );
}
