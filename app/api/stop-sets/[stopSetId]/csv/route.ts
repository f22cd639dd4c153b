import { z } from 'zod';
import { stopSetParams } from '@/lib/room/api/resources';
import { database } from '@/lib/server/database';
import { fileName } from '@/lib/server/file-name';
import { route } from '@/lib/server/route';
import { exportStopSequence } from '@/lib/server/stop-sets/export-stop-sequence';

export const GET = route({
  permission: 'rooms:read',
  params: stopSetParams,
  answer: z.string(),
  run: async ({ actor, params }) => {
    const { name, csv } = await exportStopSequence((await database()).db, actor, params.stopSetId);
    return { value: csv, download: fileName(name, 'csv'), type: 'text/csv; charset=utf-8' };
  },
});
