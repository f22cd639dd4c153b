'use client';

import { ArrowDown, ArrowUp, Download } from 'lucide-react';
import Link from 'next/link';
import { useState } from 'react';
import { roomFileAddress } from '@/lib/client/rooms';
import type { RoomSummary } from '@/lib/room/api/resources';

const columns = {
  name: { label: 'Room', of: (room: RoomSummary) => room.name },
  site: { label: 'Site', of: (room: RoomSummary) => `${room.site.name} ${room.area ?? ''}` },
  changed: { label: 'Changed', of: (room: RoomSummary) => room.updatedAt },
} as const;
type Column = keyof typeof columns;

const collator = new Intl.Collator('en', { numeric: true });
const day = new Intl.DateTimeFormat('en-GB', { day: 'numeric', month: 'short', year: 'numeric' });

/** Where a room leads first: to its stops once it is drawn. */
const roomHref = (room: RoomSummary) => `/rooms/${room.id}/${room.drawn ? 'stops' : 'floor-plan'}`;

function Status({ room }: { room: RoomSummary }) {
  if (!room.drawn) return <span className="text-ink-2">Not drawn yet</span>;
  if (room.stopSets.length === 0) return <span className="text-ink-2">No stop set</span>;
  return (
    <ul className="flex flex-wrap gap-1.5">
      {room.stopSets.slice(0, 4).map((set) => (
        <li key={set.id} className="rounded border border-ink-2/40 px-1.5 text-[13.5px] whitespace-nowrap">
          {set.name} <span className="text-ink-2">· {set.status}</span>
        </li>
      ))}
      {room.stopSets.length > 4 ? <li className="text-ink-2">+ {room.stopSets.length - 4}</li> : null}
    </ul>
  );
}

/** The rooms, sorted by the column that was asked for. On a phone each row is a card. */
export function RoomsTable({ rooms }: { rooms: readonly RoomSummary[] }) {
  const [sort, setSort] = useState<{ column: Column; down: boolean }>({ column: 'site', down: false });
  const sorted = [...rooms].sort(
    (one, two) =>
      collator.compare(columns[sort.column].of(one), columns[sort.column].of(two)) * (sort.down ? -1 : 1) ||
      collator.compare(one.name, two.name),
  );
  const heading = (column: Column) => {
    const active = sort.column === column;
    const Arrow = sort.down ? ArrowDown : ArrowUp;
    return (
      <th
        scope="col"
        aria-sort={active ? (sort.down ? 'descending' : 'ascending') : undefined}
        className="px-3 py-2 text-left"
      >
        <button
          type="button"
          className="label inline-flex items-center gap-1 hover:text-ink"
          onClick={() => setSort({ column, down: active && !sort.down })}
        >
          {columns[column].label}
          {active ? <Arrow size={13} aria-hidden /> : null}
        </button>
      </th>
    );
  };
  return (
    <div className="overflow-hidden rounded border border-rule bg-panel">
      <table className="w-full max-sm:block">
        <thead className="border-b max-sm:sr-only">
          <tr>
            {heading('name')}
            {heading('site')}
            <th scope="col" className="label px-3 py-2 text-left">
              Stop sets
            </th>
            {heading('changed')}
            <th>
              <span className="sr-only">Export</span>
            </th>
          </tr>
        </thead>
        <tbody className="max-sm:block">
          {sorted.map((room) => (
            <tr
              key={room.id}
              className="relative border-b last:border-b-0 hover:bg-wash/60 max-sm:block max-sm:p-3"
            >
              <td className="px-3 py-2.5 max-sm:block max-sm:p-0">
                <Link
                  href={roomHref(room)}
                  className="text-[16px] font-semibold after:absolute after:inset-0 sm:whitespace-nowrap"
                >
                  {room.name}
                </Link>
              </td>
              <td className="px-3 py-2.5 max-sm:block max-sm:p-0">
                {room.site.name}
                {room.area ? <span className="text-ink-2"> · {room.area}</span> : null}
              </td>
              <td className="px-3 py-2.5 max-sm:block max-sm:px-0 max-sm:py-1.5">
                <Status room={room} />
              </td>
              <td className="px-3 py-2.5 text-sm whitespace-nowrap text-ink-2 max-sm:block max-sm:p-0">
                {day.format(new Date(room.updatedAt))}
                {room.updatedBy ? `, ${room.updatedBy}` : ''}
              </td>
              <td className="px-3 py-2.5 text-right max-sm:absolute max-sm:top-2 max-sm:right-2 max-sm:p-0">
                {room.drawn ? (
                  <a
                    href={roomFileAddress(room.id)}
                    download
                    className="relative z-10 inline-grid size-9 place-items-center rounded text-link hover:bg-wash"
                    aria-label={`Export ${room.name} as a room file`}
                    title="Export as a room file"
                  >
                    <Download size={17} aria-hidden />
                  </a>
                ) : null}
              </td>
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  );
}
