import { createCanvas } from '@napi-rs/canvas';
import type { Dice } from './dice';
import type { Paper } from './sheet-of-paper';
import type { Story } from './story';

/** A name in the slanted letters that a word processor signs with. */
export function scriptSignature(paper: Paper, { truth, signer }: Story, x: number): void {
  if (truth.signature_present) paper.text(signer, x, paper.y - 3, { slanted: true, size: 17 });
}

/** A signature that was once scanned and is pasted into each certificate. */
export async function pastedSignature(paper: Paper, { truth }: Story, dice: Dice, x: number): Promise<void> {
  const strokes = Array.from({ length: 8 }, () => [dice.whole(10, 28), dice.whole(-22, 22)] as const);
  if (!truth.signature_present) return;
  const canvas = createCanvas(260, 70);
  const context = canvas.getContext('2d');
  context.strokeStyle = '#1a2260';
  context.lineWidth = 3;
  context.beginPath();
  let [px, py] = [12, 44];
  context.moveTo(px, py);
  for (const [across, up] of strokes) {
    context.quadraticCurveTo(px + across / 2, py - up * 1.6, px + across, 38 + up / 2);
    [px, py] = [px + across, 38 + up / 2];
  }
  context.stroke();
  await paper.paste(canvas.toBuffer('image/png'), [x, paper.y], [130, 35]);
}
