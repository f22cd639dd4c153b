'use client';

import Link from 'next/link';
import { useEmitters, useFloorPlan, useRoom, useStopSets } from '@/components/hooks/queries';
import { DeskHeader, roomCrumbs, roomTabs } from '@/components/shell/desk-header';
import { useUser } from '@/components/shell/user';
import { buttonClass } from '@/components/ui/button';
import { Empty, Skeleton } from '@/components/ui/empty';
import { Failure } from '@/components/ui/failure';
import { can } from '@/lib/access/permissions';
import { StopsDesk } from './stops-desk';

/** Loads what the page needs, and draws the states in which there is nothing to edit yet. */
export function StopsPage({ roomId }: { roomId: string }) {
  const user = useUser();
  const room = useRoom(roomId);
  const plan = useFloorPlan(roomId);
  const sets = useStopSets(roomId);
  const emitters = useEmitters();
  const loads = [room, plan, sets, emitters];
  const failed = loads.find((load) => load.isError);
  const header = <DeskHeader crumbs={roomCrumbs(room.data)} tabs={roomTabs(roomId)} />;

  if (failed?.error)
    return (
      <>
        {header}
        <Failure
          error={failed.error}
          what="room"
          onRetry={() => {
            for (const load of loads) void load.refetch();
          }}
        />
      </>
    );
  if (!room.data || !plan.data || !sets.data || !emitters.data)
    return (
      <div className="flex h-dvh flex-col">
        {header}
        <div className="flex flex-1 gap-4 p-4" aria-busy="true">
          <Skeleton className="h-full flex-1" />
          <Skeleton className="hidden h-full w-[340px] lg:block" />
        </div>
      </div>
    );
  if (!plan.data.document)
    return (
      <>
        {header}
        <main className="mx-auto max-w-xl p-6">
          <Empty
            title="Draw the room first"
            action={
              <Link href={`/rooms/${roomId}/floor-plan`} className={buttonClass('primary')}>
                Go to the floor plan
              </Link>
            }
          >
            Stops stand in a drawn room: its walls to measure from, and its furniture to cast shadows.
          </Empty>
        </main>
      </>
    );
  return (
    <StopsDesk
      room={room.data}
      document={plan.data.document}
      revision={plan.data.revision}
      planVersion={plan.data.version}
      loadedSets={sets.data.stopSets}
      emitters={emitters.data.emitters}
      mayWrite={can(user.role, 'stop-sets:write')}
    />
  );
}
