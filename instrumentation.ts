/** Runs once when the server starts, before the first request; the build does not run it. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { start } = await import('@/lib/server/start');
  await start();
}
