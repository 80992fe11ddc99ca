import { cards, heading, inlinePairs, pairs, table, twoColumns } from './blocks';
import {
  cyclePairs,
  cyclesGrid,
  furnacePairs,
  headPairs,
  partsGrid,
  readingPairs,
  readingsGrid,
  statement,
  type Told,
} from './content';
import { signatureBlock, type Layout } from './layout';
import { emailText, letterProse } from './prose';
import { Paper } from './sheet-of-paper';

const LETTER = [612, 792] as const;
const A4 = [595, 842] as const;

function letterhead(paper: Paper, { story }: Told, style: 'left' | 'centre' | 'banner'): void {
  const x = style === 'centre' ? paper.width / 2 : 50;
  const align = style === 'centre' ? 'centre' : 'left';
  paper.y = 52;
  if (style === 'banner') paper.shade(0, 24, paper.width, 46);
  paper.text(story.truth.processor ?? '', x, paper.y, { bold: true, size: paper.size * 1.7, align });
  paper.text(story.address.join('  •  '), x, paper.y + 15, { size: paper.size * 0.85, align });
  paper.y += 42;
}

function title(paper: Paper, words: string, align: 'left' | 'centre' = 'centre'): void {
  paper.text(words, align === 'centre' ? paper.width / 2 : 50, paper.y, {
    bold: true,
    size: paper.size * 1.35,
    align,
  });
  paper.y += paper.size * 2.4;
}

/** A letter: a date by itself, a reference, sentences, a small table. */
const letter: Layout = {
  name: 'letter',
  hand: 'american',
  async draw(told) {
    const paper = await Paper.open('Times', 11, LETTER);
    letterhead(paper, told, 'left');
    const { story, hand } = told;
    paper.text(hand.day(story.truth.certificate_date ?? ''), 50, paper.y);
    paper.y += 30;
    for (const line of [story.customer, '88 Runway Drive', 'Mesa, AZ 85201']) {
      paper.text(line, 50, paper.y);
      paper.y += 14;
    }
    paper.y += 16;
    for (const text of letterProse(told)) {
      paper.prose(text, 50, 500);
      paper.y += 8;
    }
    const parts = partsGrid(told, false);
    table(paper, parts, [50, 500], { rules: 'none' });
    paper.prose(statement(told), 50, 500);
    paper.y += 50;
    signatureBlock(paper, told, 50);
    return paper.save();
  },
};

/** Boxes with a small label above each value. */
const boxedForm: Layout = {
  name: 'boxed form',
  hand: 'american',
  async draw(told) {
    const paper = await Paper.open('Helvetica', 10, LETTER);
    letterhead(paper, told, 'centre');
    title(paper, 'CERTIFICATE OF CONFORMANCE');
    cards(paper, headPairs(told), [40, 530], { columns: 3, framed: true });
    const parts = partsGrid(told);
    table(paper, parts, [40, 530], { rules: 'all', shaded: true });
    const cycles = cyclesGrid(told);
    if (cycles.rows.length > 0) table(paper, cycles, [40, 530], { rules: 'all', shaded: true });
    cards(paper, [...furnacePairs(told), ...readingPairs(told)], [40, 530], { columns: 2, framed: true });
    paper.prose(statement(told), 44, 520);
    paper.y += 40;
    signatureBlock(paper, told, 44);
    return paper.save();
  },
};

/** Small letters, everything in tables. */
const denseTable: Layout = {
  name: 'dense table',
  hand: 'american',
  async draw(told) {
    const paper = await Paper.open('Helvetica', 8, LETTER);
    letterhead(paper, told, 'left');
    title(paper, `${told.story.work.title.toUpperCase()} CERTIFICATION`, 'left');
    twoColumns(paper, headPairs(told), 50, { columnWidth: 260, labelWidth: 105, mark: ':', boldLabel: true });
    paper.y += 10;
    const parts = partsGrid(told);
    table(paper, parts, [50, 510], { rules: 'all', align: 'centre' });
    const cycles = cyclesGrid(told);
    if (cycles.rows.length > 0) table(paper, cycles, [50, 510], { rules: 'all', align: 'centre' });
    const readings = readingsGrid(told);
    if (readings.rows.length > 0) table(paper, readings, [50, 510], { rules: 'all' });
    pairs(paper, furnacePairs(told), 50, { labelWidth: 120, mark: ':' });
    paper.y += 8;
    paper.prose(statement(told), 50, 510);
    paper.y += 40;
    signatureBlock(paper, told, 330);
    return paper.save();
  },
};

const landscape: Layout = {
  name: 'landscape',
  hand: 'american',
  async draw(told) {
    const paper = await Paper.open('Helvetica', 10, [792, 612]);
    letterhead(paper, told, 'centre');
    title(paper, 'Certificate of Compliance');
    twoColumns(paper, headPairs(told), 60, { columnWidth: 350, labelWidth: 150, mark: '' });
    paper.y += 6;
    const parts = partsGrid(told);
    table(paper, parts, [60, 670], { rules: 'horizontal' });
    const cycles = cyclesGrid(told);
    if (cycles.rows.length > 0) table(paper, cycles, [60, 670], { rules: 'horizontal' });
    twoColumns(paper, [...furnacePairs(told), ...readingPairs(told)], 60, {
      columnWidth: 350,
      labelWidth: 150,
      mark: ':',
    });
    paper.y += 6;
    paper.prose(statement(told), 60, 660);
    paper.y += 34;
    signatureBlock(paper, told, 60);
    return paper.save();
  },
};

/** Head and parts on the first page, what was done on the second. */
const twoPages: Layout = {
  name: 'two pages',
  hand: 'american',
  async draw(told) {
    const paper = await Paper.open('Helvetica', 10.5, LETTER);
    letterhead(paper, told, 'left');
    title(paper, 'CERTIFICATION OF PROCESS', 'left');
    paper.text('Page 1 of 2', 560, 40, { align: 'right', size: 9 });
    pairs(paper, headPairs(told), 50, { labelWidth: 170, mark: ':' });
    paper.y += 10;
    const parts = partsGrid(told);
    table(paper, parts, [50, 510], { rules: 'horizontal', shaded: true });
    paper.turnPage();
    paper.text(told.story.truth.processor ?? '', 50, 44, { bold: true });
    paper.text(`Certificate No. ${told.story.truth.certificate_number ?? ''}`, 50, 58);
    paper.text('Page 2 of 2', 560, 40, { align: 'right', size: 9 });
    paper.y = 90;
    if (told.story.truth.cycles.length > 0) heading(paper, 'Thermal processing', 50);
    pairs(paper, [...cyclePairs(told), ...furnacePairs(told)], 50, { labelWidth: 230, mark: ':' });
    paper.y += 10;
    if (told.story.truth.readings.length > 0) heading(paper, 'Test results', 50);
    pairs(paper, readingPairs(told), 50, { labelWidth: 230, mark: ':' });
    paper.y += 16;
    paper.prose(statement(told), 50, 500);
    paper.y += 50;
    signatureBlock(paper, told, 50);
    return paper.save();
  },
};

/** A typewriter: one letter as wide as another, dots between label and value. */
const typewriter: Layout = {
  name: 'typewriter',
  hand: 'american',
  async draw(told) {
    const paper = await Paper.open('Courier', 10, LETTER);
    paper.y = 50;
    for (const line of [told.story.truth.processor ?? '', ...told.story.address]) {
      paper.text(line.toUpperCase(), 306, paper.y, { align: 'centre' });
      paper.y += 13;
    }
    paper.y += 12;
    title(paper, `${told.story.work.title.toUpperCase()} CERTIFICATE`);
    pairs(paper, headPairs(told), 60, { labelWidth: 230, mark: '....' });
    paper.y += 8;
    const parts = partsGrid(told, false);
    table(paper, parts, [46, 520], { rules: 'none', headSize: 9 });
    pairs(paper, [...cyclePairs(told), ...furnacePairs(told), ...readingPairs(told)], 60, {
      labelWidth: 270,
      mark: '....',
    });
    paper.y += 10;
    paper.prose(statement(told), 60, 480);
    paper.y += 44;
    signatureBlock(paper, told, 60);
    return paper.save();
  },
};

const german: Layout = {
  name: 'German, bilingual',
  hand: 'german',
  async draw(told) {
    const paper = await Paper.open('Helvetica', 10, A4);
    letterhead(paper, told, 'left');
    title(paper, 'Werkszeugnis / Certificate of Conformity', 'left');
    pairs(paper, headPairs(told), 50, { labelWidth: 190, mark: ':' });
    paper.y += 8;
    const parts = partsGrid(told);
    table(paper, parts, [50, 495], { rules: 'all' });
    const cycles = cyclesGrid(told);
    if (cycles.rows.length > 0) table(paper, cycles, [50, 495], { rules: 'all' });
    pairs(paper, [...furnacePairs(told), ...readingPairs(told)], 50, { labelWidth: 190, mark: ':' });
    paper.y += 8;
    paper.prose(statement(told), 50, 490);
    paper.y += 44;
    signatureBlock(paper, told, 50);
    return paper.save();
  },
};

/** Two columns of cells with the label above the value and no lines at all. */
const frenchCards: Layout = {
  name: 'French, label above value',
  hand: 'french',
  async draw(told) {
    const paper = await Paper.open('Helvetica', 10, A4);
    letterhead(paper, told, 'banner');
    paper.y += 10;
    title(paper, 'Certificat de conformité', 'left');
    cards(paper, headPairs(told), [46, 500], { columns: 2, framed: false, height: 34 });
    const parts = partsGrid(told);
    table(paper, parts, [50, 495], { rules: 'horizontal' });
    const cycles = cyclesGrid(told);
    if (cycles.rows.length > 0) table(paper, cycles, [50, 495], { rules: 'horizontal' });
    cards(paper, [...furnacePairs(told), ...readingPairs(told)], [46, 500], {
      columns: 3,
      framed: false,
      height: 34,
    });
    paper.prose(statement(told), 50, 490);
    paper.y += 44;
    signatureBlock(paper, told, 320);
    return paper.save();
  },
};

/** English with days first and Celsius. */
const british: Layout = {
  name: 'British, columns',
  hand: 'british',
  async draw(told) {
    const paper = await Paper.open('Times', 10.5, A4);
    letterhead(paper, told, 'centre');
    title(paper, 'RELEASE CERTIFICATE');
    twoColumns(paper, headPairs(told), 50, { columnWidth: 255, labelWidth: 125, mark: ':' });
    paper.y += 8;
    const parts = partsGrid(told, false);
    table(paper, parts, [50, 495], { rules: 'horizontal', align: 'centre' });
    if (told.story.truth.cycles.length > 0) heading(paper, 'Furnace record', 50);
    inlinePairs(paper, [...cyclePairs(told), ...furnacePairs(told)], 50, ':');
    if (told.story.truth.readings.length > 0) heading(paper, 'Test results', 50);
    inlinePairs(paper, readingPairs(told), 50, ':');
    paper.y += 8;
    paper.prose(statement(told), 50, 490);
    paper.y += 44;
    signatureBlock(paper, told, 50);
    return paper.save();
  },
};

const horizontalRules: Layout = {
  name: 'horizontal rules only',
  hand: 'american',
  async draw(told) {
    const paper = await Paper.open('Times', 10, LETTER);
    letterhead(paper, told, 'banner');
    title(paper, 'CERTIFICATE OF CONFORMANCE');
    const head = headPairs(told);
    for (let at = 0; at < head.length; at += 5) {
      const some = head.slice(at, at + 5);
      table(
        paper,
        { heads: some.map(({ label }) => label), rows: [some.map(({ value }) => value)] },
        [40, 532],
        { rules: 'horizontal', headSize: 8 },
      );
    }
    const parts = partsGrid(told);
    table(paper, parts, [40, 532], { rules: 'horizontal' });
    const cycles = cyclesGrid(told);
    if (cycles.rows.length > 0) table(paper, cycles, [40, 532], { rules: 'horizontal' });
    const others = [...furnacePairs(told), ...readingPairs(told)];
    if (others.length > 1)
      table(
        paper,
        { heads: others.map(({ label }) => label), rows: [others.map(({ value }) => value)] },
        [40, 532],
        { rules: 'horizontal' },
      );
    else pairs(paper, others, 44, { labelWidth: 140, mark: ':' });
    paper.prose(statement(told), 44, 520);
    paper.y += 44;
    signatureBlock(paper, told, 44);
    return paper.save();
  },
};

/** Required and found side by side, as a laboratory writes. */
const laboratory: Layout = {
  name: 'laboratory report',
  hand: 'american',
  async draw(told) {
    const paper = await Paper.open('Helvetica', 9.5, LETTER);
    letterhead(paper, told, 'left');
    title(paper, `${told.story.work.title} Report`, 'left');
    inlinePairs(paper, headPairs(told), 50, ':');
    const parts = partsGrid(told);
    paper.y += 4;
    table(paper, parts, [50, 510], { rules: 'all', align: 'right' });
    for (const { label, value } of cyclePairs(told)) {
      paper.text(`${label}: ${value}`, 50, paper.y);
      paper.y += 14;
    }
    pairs(paper, furnacePairs(told), 50, { labelWidth: 120, mark: '=' });
    paper.y += 6;
    const readings = readingsGrid(told);
    if (readings.rows.length > 0) table(paper, readings, [50, 510], { rules: 'horizontal' });
    paper.prose(statement(told), 50, 510);
    paper.y += 44;
    signatureBlock(paper, told, 300);
    return paper.save();
  },
};

/** A mail in plain words. */
const email: Layout = {
  name: 'e-mail',
  hand: 'american',
  textOnly: true,
  draw: (told) => Promise.resolve(new TextEncoder().encode(emailText(told))),
};

export const LAYOUTS: readonly Layout[] = [
  letter,
  boxedForm,
  denseTable,
  landscape,
  twoPages,
  typewriter,
  german,
  frenchCards,
  british,
  horizontalRules,
  laboratory,
  email,
];
