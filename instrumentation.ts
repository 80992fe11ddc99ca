export async function register(): Promise<void> {
  // eslint-disable-next-line no-restricted-syntax -- Next's own name of the runtime, replaced while building; no setting
  if (process.env['NEXT_RUNTIME'] !== 'nodejs') return;
  const { notePeers } = await import('./app/_kit/note-peers');
  notePeers();
}
