/** The sheet's title block, in its lower right corner. */
export function TitleBlock({ entries }: { entries: readonly { label: string; value: string }[] }) {
  return (
    <dl className="on-sheet pointer-events-none absolute right-3 bottom-3 hidden max-w-[calc(100%-24px)] border border-[#1e2326] bg-[#fcfbf7] text-[#1e2326] sm:flex">
      {entries.map(({ label, value }) => (
        <div key={label} className="min-w-0 border-l border-[#1e2326] px-2.5 py-1 first:border-l-0">
          <dt className="font-condensed text-[11px] tracking-[0.08em] text-[#525b5f] uppercase">{label}</dt>
          <dd className="truncate font-condensed text-[13px] font-semibold uppercase">{value}</dd>
        </div>
      ))}
    </dl>
  );
}
