'use client';

import { useMutation, useQueryClient } from '@tanstack/react-query';
import dynamic from 'next/dynamic';
import { useState } from 'react';
import { DeskHeader, roomCrumbs, roomTabs } from '@/components/shell/desk-header';
import { Button } from '@/components/ui/button';
import { Empty } from '@/components/ui/empty';
import { Notice } from '@/components/ui/notice';
import { newId } from '@/lib/client/new-id';
import { queryKeys } from '@/lib/client/query-keys';
import { addStopSet, fetchStopSet } from '@/lib/client/stop-sets';
import type { Emitters, FloorPlanDocument, StopSet } from '@/lib/room';
import type { RevisionSummary, RoomSummary, StopSetResource } from '@/lib/room/api/resources';

// The sheet is a canvas: it exists in the browser only.
const SetEditor = dynamic(() => import('./set-editor').then((module) => module.SetEditor), { ssr: false });

/** A target to begin with; the planner is shown where it comes from and is asked to choose. */
const firstTarget = {
  name: 'SARS-CoV-2, liquid film, complete',
  dose: 169,
  source: 'Biasin et al. 2021, Sci. Rep. 11:6260',
};

const newStopSet = (name: string, emitter: string): StopSet => ({
  id: newId(),
  name,
  emitter,
  target: firstTarget,
  margin: 1.5,
  stops: [],
  passes: [],
});

/** Which stop set of the room is on the desk; adding and copying one. */
export function StopsDesk({
  room,
  document,
  revision,
  planVersion,
  loadedSets,
  emitters,
  mayWrite,
}: {
  room: RoomSummary;
  document: FloorPlanDocument;
  revision: RevisionSummary | null;
  planVersion: number;
  loadedSets: readonly StopSetResource[];
  emitters: Emitters;
  mayWrite: boolean;
}) {
  const queries = useQueryClient();
  const [sets, setSets] = useState(loadedSets);
  const [activeId, setActiveId] = useState(loadedSets[0]?.stopSet.id ?? null);
  const active = sets.find((set) => set.stopSet.id === activeId);

  const add = useMutation({
    mutationFn: async (set: StopSet) => {
      await addStopSet(room.id, set);
      return fetchStopSet(set.id);
    },
    onSuccess: (added) => {
      setSets((before) => [...before, added]);
      setActiveId(added.stopSet.id);
      void queries.invalidateQueries({ queryKey: queryKeys.rooms, refetchType: 'none' });
    },
  });
  const emitterKeys = Object.keys(emitters);
  const firstEmitter = emitterKeys.includes('tower') ? 'tower' : emitterKeys[0];

  /** Another set comes onto the desk as it is saved now, not as it was when the page opened. */
  const open = async (id: string) => {
    const fresh = await fetchStopSet(id);
    setSets((before) => before.map((set) => (set.stopSet.id === id ? fresh : set)));
    setActiveId(id);
  };

  if (!active)
    return (
      <>
        <DeskHeader crumbs={roomCrumbs(room)} tabs={roomTabs(room.id)} />
        <main className="mx-auto max-w-xl p-6">
          {add.error ? (
            <Notice tone="danger" role="alert">
              {add.error.message}
            </Notice>
          ) : null}
          <Empty
            title="No stop set yet"
            action={
              mayWrite && firstEmitter ? (
                <Button
                  variant="primary"
                  disabled={add.isPending}
                  onClick={() => add.mutate(newStopSet('First stop set', firstEmitter))}
                >
                  Start a stop set
                </Button>
              ) : null
            }
          >
            {firstEmitter
              ? 'A stop set says where the emitter stands, how long it stays lit there, and which dose every surface must get.'
              : 'There is no emitter yet. The owner adds emitters.'}
            {mayWrite ? '' : ' A planner can start one.'}
          </Empty>
        </main>
      </>
    );
  return (
    <SetEditor
      key={`${active.stopSet.id} ${active.version}`}
      room={room}
      document={document}
      revision={revision}
      planVersion={planVersion}
      resource={active}
      sets={sets.map(({ stopSet, status }) => ({ id: stopSet.id, name: stopSet.name, status }))}
      emitters={emitters}
      editable={mayWrite && active.status === 'draft'}
      mayWrite={mayWrite}
      onOpen={open}
      onAdd={(copyOf) =>
        add.mutateAsync(
          copyOf
            ? { ...copyOf, id: newId(), name: `${copyOf.name} (copy)`.slice(0, 80) }
            : newStopSet(`Stop set ${sets.length + 1}`, firstEmitter),
        )
      }
    />
  );
}
