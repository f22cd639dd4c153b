import { database } from '@/lib/server/database';

/** Says that the server is up and its database answers; nothing more, to anyone. */
export async function GET(): Promise<Response> {
  const headers = { 'cache-control': 'no-store' };
  try {
    const { db } = await database();
    await db.run('select 1');
    return Response.json({ ok: true }, { headers });
  } catch (error) {
    console.error(error);
    return Response.json({ ok: false }, { status: 503, headers });
  }
}

export const dynamic = 'force-dynamic';
