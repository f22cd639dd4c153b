'use client';

import dynamic from 'next/dynamic';
import { useFloorPlan, useRoom } from '@/components/hooks/queries';
import { DeskHeader, roomCrumbs, roomTabs } from '@/components/shell/desk-header';
import { useUser } from '@/components/shell/user';
import { Skeleton } from '@/components/ui/empty';
import { Failure } from '@/components/ui/failure';
import { can } from '@/lib/access/permissions';

// The sheet is a canvas: it exists in the browser only.
const PlanEditor = dynamic(() => import('./plan-editor').then((module) => module.PlanEditor), { ssr: false });

/** Loads the room and its working plan, and draws the states in which there is nothing to edit. */
export function FloorPlanPage({ roomId }: { roomId: string }) {
  const user = useUser();
  const room = useRoom(roomId);
  const plan = useFloorPlan(roomId);
  const failed = [room, plan].find((load) => load.isError);
  const header = <DeskHeader crumbs={roomCrumbs(room.data)} tabs={roomTabs(roomId)} />;
  if (failed?.error)
    return (
      <>
        {header}
        <Failure
          error={failed.error}
          what="floor plan"
          onRetry={() => {
            void room.refetch();
            void plan.refetch();
          }}
        />
      </>
    );
  if (!room.data || !plan.data)
    return (
      <div className="flex h-dvh flex-col">
        {header}
        <div className="flex flex-1 gap-4 p-4" aria-busy="true">
          <Skeleton className="h-full flex-1" />
          <Skeleton className="hidden h-full w-[340px] lg:block" />
        </div>
      </div>
    );
  return <PlanEditor room={room.data} resource={plan.data} editable={can(user.role, 'floor-plans:write')} />;
}
