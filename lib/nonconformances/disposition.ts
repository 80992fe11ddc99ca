export const DISPOSITIONS = ['use_as_is', 'reprocess', 'return_to_processor', 'scrap', 'concession'] as const;
export type Disposition = (typeof DISPOSITIONS)[number];
