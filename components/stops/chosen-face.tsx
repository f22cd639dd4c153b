'use client';

import { useMemo } from 'react';
import type { DosePicture } from '@/components/hooks/dose-session';
import { stripStarts } from '@/lib/engine';
import type { FloorPlan } from '@/lib/room';
import { faceNames } from '@/lib/room/face-names';
import { UnrolledFace } from './unrolled-face';

/** The upright face that was clicked or that a chosen gap lies on. */
export function ChosenFace({
  plan,
  picture,
  face,
  onClose,
}: {
  plan: FloorPlan;
  picture: DosePicture;
  face: number;
  onClose: () => void;
}) {
  const strips = picture.surface.kind === 'sides' ? picture.surface.strips : null;
  const strip = strips?.[face];
  const starts = useMemo(() => stripStarts(strips ?? []), [strips]);
  if (!strip) return null;
  return (
    <UnrolledFace
      name={faceNames(plan, [strip])[0]}
      strip={strip}
      ratio={picture.ratio.subarray(starts[face], starts[face + 1])}
      onClose={onClose}
    />
  );
}
