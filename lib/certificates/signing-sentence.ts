/** What a person signs. The words are sealed with the signature. */
export function signingSentence({ dispatchedToo }: { dispatchedToo: boolean }): string {
  const sentence =
    'I have compared this certificate with the order and the pieces counted. It covers the pieces named above and no others.';
  return dispatchedToo ? `${sentence} I also dispatched this batch.` : sentence;
}
