export const DISPOSITIONS = ['use_as_is', 'reprocess', 'return_to_processor', 'scrap', 'concession'] as const;
export type Disposition = (typeof DISPOSITIONS)[number];

export const DISPOSITION_WORDS: Record<Disposition, string> = {
  use_as_is: 'use as is',
  reprocess: 'reprocess',
  return_to_processor: 'return to processor',
  scrap: 'scrap',
  concession: 'concession',
};
