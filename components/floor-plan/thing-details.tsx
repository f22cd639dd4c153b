'use client';

import { Copy, Trash2 } from 'lucide-react';
import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { nameOf } from '@/lib/editor/thing-actions';
import type { PlanRef } from '@/lib/room/plan-ref';
import { placedTouchPoints } from '@/lib/room/touch-points';
import { edgeOf } from '@/lib/room/wall-geometry';
import type { DetailsProps } from './details/details-props';
import { FurnitureDetails } from './details/furniture-details';
import { InnerWallDetails } from './details/inner-wall-details';
import { OpeningDetails } from './details/opening-details';
import { OutlineWallDetails } from './details/outline-wall-details';
import { TouchPointDetails, WatchPointDetails } from './details/spot-details';

/** Exact values of the chosen thing. */
export function ThingDetails({
  thing,
  onDuplicate,
  onRemove,
  onSelect,
  ...props
}: DetailsProps & {
  thing: PlanRef;
  onDuplicate: () => void;
  onRemove: () => void;
  onSelect: (ref: PlanRef | null) => void;
}) {
  const name = nameOf(props.document, thing);
  return (
    <section
      aria-label={name}
      className="grid grid-cols-2 gap-3 rounded border border-rule bg-desk/60 p-3"
      data-chosen={thing.kind}
    >
      <Fields thing={thing} onSelect={onSelect} {...props} />
      {props.editable ? (
        <div className="col-span-2 flex flex-wrap gap-2">
          {thing.kind === 'outline-wall' ? null : (
            <>
              <Button size="small" icon={<Copy size={15} aria-hidden />} onClick={onDuplicate}>
                Duplicate
              </Button>
              <Button
                size="small"
                variant="danger"
                icon={<Trash2 size={15} aria-hidden />}
                onClick={onRemove}
              >
                Delete
              </Button>
            </>
          )}
        </div>
      ) : null}
    </section>
  );
}

function Fields({
  thing: { kind, id },
  onSelect,
  ...props
}: DetailsProps & { thing: PlanRef; onSelect: (ref: PlanRef | null) => void }): ReactNode {
  const { floorPlan } = props.document;
  switch (kind) {
    case 'outline-wall':
      return <OutlineWallDetails edge={edgeOf(id) ?? 0} onSelect={onSelect} {...props} />;
    case 'inner-wall': {
      const wall = floorPlan.innerWalls.find((candidate) => candidate.id === id);
      return wall ? <InnerWallDetails wall={wall} {...props} /> : null;
    }
    case 'opening': {
      const opening = floorPlan.openings.find((candidate) => candidate.id === id);
      return opening ? <OpeningDetails opening={opening} {...props} /> : null;
    }
    case 'furniture': {
      const piece = floorPlan.furniture.find((candidate) => candidate.id === id);
      return piece ? <FurnitureDetails piece={piece} onSelect={onSelect} {...props} /> : null;
    }
    case 'touch-point': {
      const spot = placedTouchPoints(floorPlan).find(({ point }) => point.id === id);
      return spot ? <TouchPointDetails spot={spot} {...props} /> : null;
    }
    case 'watch-point': {
      const point = floorPlan.watchPoints.find((candidate) => candidate.id === id);
      return point ? <WatchPointDetails point={point} {...props} /> : null;
    }
  }
}
