import type { CertificateDetail, CertificateState, ProvedLine } from '@/lib/certificates/contract';

export const STATE_WORDS: Record<CertificateState, string> = {
  waiting: 'waits to be proved',
  signed: 'signed',
  set_aside: 'set aside',
};

/** `26-04177`, or what stands for a number until the inspector has read it. */
export const certificateName = (certificate: { number: string | null; fileName?: string }): string =>
  certificate.number ?? certificate.fileName ?? 'without number yet';

/** First and last of a hash: enough for an eye to compare, the whole is in the record. */
export const shortHash = (sha256: string): string => `${sha256.slice(0, 4)}…${sha256.slice(-4)}`;

/** The hash in groups of four, as it is read out. */
export const hashStart = (sha256: string): string => sha256.slice(0, 16).replaceAll(/(.{4})(?=.)/g, '$1 ');

export const lineName = ({
  partNumber,
  partRevision,
}: Pick<ProvedLine, 'partNumber' | 'partRevision'>): string => `${partNumber} rev ${partRevision}`;

/** Rows of the list: requirements of the batch, of each line, then the lines with their pieces. */
export function rowsOf({ requirements, lines }: Pick<CertificateDetail, 'requirements' | 'lines'>): string[] {
  return [...requirements.map((one) => one.id), ...lines.map((one) => one.id)];
}
