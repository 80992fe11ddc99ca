import type { FilePurpose } from './purpose';

/** Every kind of file that is taken in, with the endings its name may have. Nothing else is kept. */
const KINDS = {
  pdf: { mediaType: 'application/pdf', endings: ['pdf'], says: 'a PDF' },
  png: { mediaType: 'image/png', endings: ['png'], says: 'a PNG picture' },
  jpeg: { mediaType: 'image/jpeg', endings: ['jpg', 'jpeg'], says: 'a JPEG picture' },
  tiff: { mediaType: 'image/tiff', endings: ['tif', 'tiff'], says: 'a TIFF picture' },
  webp: { mediaType: 'image/webp', endings: ['webp'], says: 'a WebP picture' },
  heic: { mediaType: 'image/heic', endings: ['heic', 'heif'], says: 'a HEIC picture' },
  csv: { mediaType: 'text/csv', endings: ['csv'], says: 'a CSV file' },
  tsv: { mediaType: 'text/tab-separated-values', endings: ['tsv', 'tab'], says: 'a TSV file' },
  txt: { mediaType: 'text/plain', endings: ['txt', 'log'], says: 'a text file' },
  eml: { mediaType: 'message/rfc822', endings: ['eml'], says: 'a saved mail' },
} as const satisfies Record<string, { mediaType: string; endings: readonly string[]; says: string }>;
export type FileKind = keyof typeof KINDS;

const PAPER = ['pdf', 'png', 'jpeg', 'tiff'] as const;

/** What may be sent for which purpose. Documents that the product makes itself are never sent. */
const TAKEN: Partial<Record<FilePurpose, readonly FileKind[]>> = {
  drawing: PAPER,
  mill_certificate: PAPER,
  certificate: [...PAPER, 'eml', 'txt'],
  invoice: [...PAPER, 'eml', 'txt'],
  chart: ['csv', 'tsv', 'txt', ...PAPER],
  photo: ['jpeg', 'png', 'webp', 'heic', 'tiff'],
  concession: [...PAPER, 'eml', 'txt'],
};

const PURPOSE_WORDS: Record<FilePurpose, string> = {
  drawing: 'drawing',
  mill_certificate: 'mill certificate',
  certificate: 'certificate',
  chart: 'chart',
  invoice: 'invoice',
  photo: 'photo',
  concession: 'concession',
  traveller: 'traveller',
  purchase_order: 'purchase order',
  dossier: 'dossier',
  archive: 'archive',
};

export const LARGEST_FILE = 50 * 1024 * 1024;

export const purposeWords = (purpose: FilePurpose): string => PURPOSE_WORDS[purpose];
export const kindWords = (kind: FileKind): string => KINDS[kind].says;
export const mediaTypeOf = (kind: FileKind): string => KINDS[kind].mediaType;
const kindNames = Object.keys(KINDS) as FileKind[];

/** For the browser's file chooser. A phone offers its camera only where a type of picture is named. */
export const acceptedFiles = (purpose: FilePurpose): string =>
  (TAKEN[purpose] ?? [])
    .flatMap((kind) => [
      ...KINDS[kind].endings.map((ending) => `.${ending}`),
      ...(KINDS[kind].mediaType.startsWith('image/') ? [KINDS[kind].mediaType] : []),
    ])
    .join(',');

/** The kind a stored media type stands for. */
export const kindOfMediaType = (mediaType: string): FileKind | null =>
  kindNames.find((kind) => KINDS[kind].mediaType === mediaType) ?? null;

/** Shown in a page of its own, sandboxed, instead of being saved. */
export const mayBeShownInline = (mediaType: string): boolean =>
  mediaType === 'application/pdf' || mediaType.startsWith('image/');

export interface Announced {
  purpose: FilePurpose;
  name: string;
  mediaType: string;
  size: number;
}

/** What a file says it is by its name (by the browser's word where the name has no ending), or why it is not taken. */
export function claimedKind(file: Announced): { kind: FileKind } | { refusal: string; tooLarge: boolean } {
  const taken = TAKEN[file.purpose] ?? [];
  const ending = /\.([^.]+)$/.exec(file.name)?.[1]?.toLowerCase();
  const kind =
    ending === undefined
      ? kindOfMediaType(file.mediaType)
      : kindNames.find((one) => (KINDS[one].endings as readonly string[]).includes(ending));
  const word = PURPOSE_WORDS[file.purpose];
  if (!kind || !taken.includes(kind))
    return {
      refusal: `${file.name} cannot be ${withArticle(word)}: that is ${oneOf(taken)}. Save it as one of these and send that.`,
      tooLarge: false,
    };
  if (file.size === 0)
    return {
      refusal: `${file.name} is empty: it has 0 bytes. Look at the file on your side and choose it again.`,
      tooLarge: false,
    };
  if (file.size > LARGEST_FILE)
    return {
      refusal: `${file.name} has ${sizeWords(file.size)}; the most is 50 MB. Scan it in fewer colours or split it.`,
      tooLarge: true,
    };
  return { kind };
}

/** `1.8 MB`, `240 KB`, `12 bytes` */
export function sizeWords(bytes: number): string {
  if (bytes < 1024) return `${bytes} bytes`;
  if (bytes < 1024 * 1024) return `${Math.round(bytes / 1024)} KB`;
  return `${(bytes / 1024 / 1024).toFixed(1)} MB`;
}

const withArticle = (word: string) => (/^[aeiou]/.test(word) ? `an ${word}` : `a ${word}`);

function oneOf(kinds: readonly FileKind[]): string {
  const says = kinds.map((kind) => KINDS[kind].says);
  if (says.length === 0) return 'made by Lotwright itself';
  return `${says.slice(0, -1).join(', ')} or ${says.at(-1)}`;
}
