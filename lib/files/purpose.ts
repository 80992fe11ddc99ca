/** What a file is kept for. Decides who may read it and which types it may have. */
export const FILE_PURPOSES = [
  'drawing',
  'mill_certificate',
  'certificate',
  'chart',
  'invoice',
  'photo',
  'concession',
  'traveller',
  'purchase_order',
  'dossier',
  'archive',
] as const;
export type FilePurpose = (typeof FILE_PURPOSES)[number];

export const FILE_STATES = ['awaited', 'verified', 'refused'] as const;
export type FileState = (typeof FILE_STATES)[number];
