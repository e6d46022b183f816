/** Runs once when the server process starts, before the first request. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== 'nodejs') return;
  const { nameSocketAddresses } = await import('./lib/server/http/socket-address');
  nameSocketAddresses();
  const { sealInTheBackground } = await import('./lib/server/services/audit/seal-in-the-background');
  sealInTheBackground();
}
