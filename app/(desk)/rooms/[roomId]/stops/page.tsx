import type { Metadata } from 'next';
import { StopsPage } from '@/components/stops/stops-page';

export const metadata: Metadata = { title: 'Stops & dose' };

export default async function Stops({ params }: { params: Promise<{ roomId: string }> }) {
  return <StopsPage roomId={(await params).roomId} />;
}
