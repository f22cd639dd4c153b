'use client';

import Link from 'next/link';
import { usePathname } from 'next/navigation';
import type { ReactNode } from 'react';
import type { RoomSummary } from '@/lib/room/api/resources';
import { Mark } from './mark';
import { UserMenu } from './user-menu';

export interface Crumb {
  readonly label: string;
  readonly href?: string;
}

export interface Tab {
  readonly label: string;
  readonly href: string;
}

/** Where you are on the left, the room's pages in the middle, how saving stands and who you are on the right. */
export function DeskHeader({
  crumbs,
  tabs = [],
  status,
}: {
  crumbs: readonly Crumb[];
  tabs?: readonly Tab[];
  status?: ReactNode;
}) {
  const pathname = usePathname();
  return (
    <header className="flex shrink-0 flex-wrap items-center gap-x-6 bg-harbour px-4 text-on-harbour sm:px-5">
      <div className="flex min-w-0 flex-1 items-center gap-5 py-2 lg:basis-0">
        <Link href="/sites" className="flex items-center gap-2.5" aria-label="Leeside: sites and rooms">
          <Mark />
          <span className="hidden font-condensed text-xl font-semibold tracking-[0.08em] sm:inline">
            LEESIDE
          </span>
        </Link>
        <nav aria-label="Where you are" className="min-w-0">
          <ol className="flex min-w-0 items-center gap-2 text-[14.5px]">
            {crumbs.map((crumb, index) => {
              const last = index === crumbs.length - 1;
              return (
                <li
                  key={crumb.label}
                  className={`flex items-center gap-2 ${last ? 'min-w-0' : 'hidden shrink-0 text-on-harbour-2 md:flex'}`}
                >
                  {crumb.href && !last ? (
                    <Link href={crumb.href} className="hover:underline">
                      {crumb.label}
                    </Link>
                  ) : (
                    <CrumbText label={crumb.label} last={last} title={tabs.length > 0} />
                  )}
                  {last ? null : <span aria-hidden>/</span>}
                </li>
              );
            })}
          </ol>
        </nav>
      </div>
      {tabs.length > 0 ? (
        <nav
          aria-label="Pages of this room"
          className="order-last -mx-1 flex w-full gap-1 overflow-x-auto lg:order-none lg:w-auto"
        >
          {tabs.map((tab) => {
            const current = pathname === tab.href;
            return (
              <Link
                key={tab.href}
                href={tab.href}
                aria-current={current ? 'page' : undefined}
                className={`border-b-2 px-3 py-2.5 font-medium whitespace-nowrap lg:py-3.5 ${
                  current ? 'border-lamp text-white' : 'border-transparent text-on-harbour-2 hover:text-white'
                }`}
              >
                {tab.label}
              </Link>
            );
          })}
        </nav>
      ) : null}
      <div className="flex items-center justify-end gap-3 text-sm text-on-harbour-2 lg:flex-1 lg:basis-0">
        {status}
        <UserMenu />
      </div>
    </header>
  );
}

/** The last crumb names the page: on a room's pages it is their heading. */
function CrumbText({ label, last, title }: { label: string; last: boolean; title: boolean }) {
  if (!last) return <span>{label}</span>;
  const look = 'truncate font-semibold';
  return title ? (
    <h1 aria-current="page" className={look}>
      {label}
    </h1>
  ) : (
    <span aria-current="page" className={look}>
      {label}
    </span>
  );
}

export const roomTabs = (roomId: string): Tab[] => [
  { label: 'Floor plan', href: `/rooms/${roomId}/floor-plan` },
  { label: 'Stops & dose', href: `/rooms/${roomId}/stops` },
];

export const roomCrumbs = (room: RoomSummary | undefined): Crumb[] =>
  room
    ? [
        { label: room.site.name, href: '/sites' },
        ...(room.area ? [{ label: room.area }] : []),
        { label: room.name },
      ]
    : [{ label: 'Sites and rooms', href: '/sites' }, { label: '…' }];
