import { type RoomFile, roomFileSchema } from '@/lib/room/schema/room-file';
import sideRoom from './rooms/side-room.json' with { type: 'json' };
import studio from './rooms/studio.json' with { type: 'json' };
import treatmentRoom from './rooms/treatment-room.json' with { type: 'json' };
import twoBedBay from './rooms/two-bed-bay.json' with { type: 'json' };
import weightsFloor from './rooms/weights-floor.json' with { type: 'json' };

/** The demo's rooms as open room files, by id. */
export const demoRooms: Readonly<Record<string, RoomFile>> = Object.fromEntries(
  Object.entries({
    'two-bed-bay': twoBedBay,
    'side-room': sideRoom,
    'treatment-room': treatmentRoom,
    'weights-floor': weightsFloor,
    studio,
  }).map(([id, file]) => [id, roomFileSchema.parse(file)]),
);
