'use client';

import { Redo2, Undo2 } from 'lucide-react';
import type { ReactNode } from 'react';
import type { Editing } from '@/components/hooks/edit-store';
import { Rail, RailAction, type RailTool } from '@/components/ui/rail';
import type { RoomSummary } from '@/lib/room/api/resources';
import { DeskHeader, roomCrumbs, roomTabs } from './desk-header';

/** An editor on the desk: the room's header, the rail with undo and redo, the sheet in the middle, the ledger beside it. */
export function EditorFrame<T extends string>({
  room,
  status,
  tools,
  tool,
  editable,
  editing,
  ledger,
  children,
  onTool,
}: {
  room: RoomSummary;
  status: ReactNode;
  tools: readonly RailTool<T>[];
  tool: T | null;
  editable: boolean;
  editing: Pick<Editing<unknown>, 'canUndo' | 'canRedo' | 'undo' | 'redo'>;
  ledger: ReactNode;
  children: ReactNode;
  onTool: (tool: T) => void;
}) {
  return (
    <div className="flex h-dvh flex-col max-lg:h-auto max-lg:min-h-dvh">
      <DeskHeader
        crumbs={roomCrumbs(room)}
        tabs={roomTabs(room.id)}
        status={editable ? status : <span>Read only</span>}
      />
      <div className="flex min-h-0 flex-1 max-lg:flex-col">
        <Rail tools={tools} value={tool} onChange={onTool}>
          {editable ? (
            <>
              <RailAction
                label="Undo"
                icon={<Undo2 size={18} aria-hidden />}
                disabled={!editing.canUndo}
                onClick={editing.undo}
              />
              <RailAction
                label="Redo"
                icon={<Redo2 size={18} aria-hidden />}
                disabled={!editing.canRedo}
                onClick={editing.redo}
              />
            </>
          ) : null}
        </Rail>
        <main className="flex min-w-0 flex-1 flex-col gap-2.5 p-3 sm:px-5">{children}</main>
        {ledger}
      </div>
    </div>
  );
}
