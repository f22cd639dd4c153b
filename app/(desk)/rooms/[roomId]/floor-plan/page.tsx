import type { Metadata } from 'next';
import { FloorPlanPage } from '@/components/floor-plan/floor-plan-page';

export const metadata: Metadata = { title: 'Floor plan' };

export default async function FloorPlan({ params }: { params: Promise<{ roomId: string }> }) {
  return <FloorPlanPage roomId={(await params).roomId} />;
}
