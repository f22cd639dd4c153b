import type { PlanAction } from '@/lib/editor/outcome';
import type { FloorPlanDocument } from '@/lib/room';

export interface DetailsProps {
  readonly document: FloorPlanDocument;
  readonly editable: boolean;
  readonly onAct: (action: PlanAction, mark?: string) => boolean;
}
