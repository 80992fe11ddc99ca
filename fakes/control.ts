/** Reads one word of a control request, and refuses words that are not on the list, so that a test with a typo fails loudly. */
export function chosenMode<const Mode extends string>(
  body: string,
  field: string,
  modes: readonly Mode[],
): Mode {
  const parsed: unknown = JSON.parse(body === '' ? '{}' : body);
  const value =
    typeof parsed === 'object' && parsed !== null ? (parsed as Record<string, unknown>)[field] : undefined;
  const mode = modes.find((each) => each === value);
  if (mode === undefined) throw new RangeError(`"${field}" must be one of: ${modes.join(', ')}.`);
  return mode;
}
