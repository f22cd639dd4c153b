import { demoPeople } from './people';
import { demoRooms } from './rooms';
import type { Organisation } from './seed-organisation';

export const marrowby: Organisation = {
  id: 'marrowby',
  name: 'Marrowby Care Group',
  people: demoPeople,
  sites: ['Marrowby Infirmary', 'Tollgate Gym'],
  rooms: demoRooms,
};
