export async function register(): Promise<void> {
  if (process.env['NEXT_RUNTIME'] !== 'nodejs') return;
  const { notePeers } = await import('./app/_kit/note-peers');
  notePeers();
}
