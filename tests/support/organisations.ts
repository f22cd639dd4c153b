import { demoRooms } from '@/db/seed/rooms';
import type { Organisation } from '@/db/seed/seed-organisation';

const { room, ...drawing } = demoRooms.studio;

/** Another organisation beside the demo's, with a site and a room of its own: nothing of the one exists for the other. */
export const fernside: Organisation = {
  id: 'fernside',
  name: 'Fernside Dental',
  people: [{ id: 'odile', name: 'Odile Marsh', email: 'odile.marsh@example.test', role: 'owner' }],
  sites: ['Fernside Surgery'],
  rooms: {
    'fernside-room': {
      ...drawing,
      room: { ...room, name: 'Surgery 1', site: 'Fernside Surgery' },
      stopSets: drawing.stopSets.map((set, i) => ({ ...set, id: `fernside-set-${i}` })),
    },
  },
};
