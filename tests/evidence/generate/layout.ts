import type { Told } from './content';
import type { Paper } from './sheet-of-paper';
import type { Truth } from './story';
import type { House } from './wording';

/** How a house sets out its certificates. */
export interface Layout {
  readonly name: string;
  readonly hand: House;
  /** Plain text: there is nothing to scan. */
  readonly textOnly?: true;
  /** What the house puts on paper of what was done; all of it where this is missing. What it leaves out is null. */
  states?(truth: Truth): Truth;
  draw(told: Told): Promise<Uint8Array>;
}

/** A line to sign on, signed with a pen unless the signature is left out, and the printed name, which signs nothing. */
export function signatureBlock(paper: Paper, { story, dice }: Told, x: number): void {
  const { truth, signer, signerTitle } = story;
  const words = dice.pick([
    'Authorized Signature',
    'Signature',
    'Quality Representative',
    'Signed',
    'Approved by',
  ]);
  const above = dice.chance(0.5);
  if (truth.signature_present) paper.sign(x + (above ? 14 : 110), paper.y - 2, dice.whole(10, 9999));
  if (above) {
    paper.rule([x, paper.y], [x + 210, paper.y]);
    paper.text(words, x, paper.y + 11, { size: 8.5 });
    paper.y += 26;
  } else {
    paper.text(`${words}:`, x, paper.y);
    paper.rule([x + 105, paper.y + 1], [x + 280, paper.y + 1]);
    paper.y += 20;
  }
  paper.text(dice.chance(0.5) ? `${signer}, ${signerTitle}` : `Name: ${signer}`, x, paper.y);
  paper.y += 14;
}
