import type { Emitters, FloorPlanDocument, StopSet } from '@/lib/room';
import type { RevisionSummary, RoomSummary, StopSetResource } from '@/lib/room/api/resources';

export interface SetEditorProps {
  room: RoomSummary;
  document: FloorPlanDocument;
  revision: RevisionSummary | null;
  planVersion: number;
  resource: StopSetResource;
  sets: readonly { id: string; name: string; status: string }[];
  emitters: Emitters;
  editable: boolean;
  mayWrite: boolean;
  onOpen: (id: string) => Promise<void>;
  /** Adds an empty stop set, or a copy of the one given. */
  onAdd: (copyOf?: StopSet) => Promise<unknown>;
}
