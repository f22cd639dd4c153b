import type { Metadata } from 'next';
import { RoomsPage } from '@/components/library/rooms-page';

export const metadata: Metadata = { title: 'Sites and rooms' };

export default function SitesPage() {
  return <RoomsPage />;
}
