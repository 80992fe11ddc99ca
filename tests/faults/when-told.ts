/** Loaded, this process waits for a word on its input before it begins, and ends when whoever holds the input is gone. */
export function whenTold(begin: () => void): void {
  process.stdin.once('data', begin);
  process.stdin.once('end', () => process.exit());
}
