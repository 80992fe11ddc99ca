import { dayWords, daysUntil, type CalendarDay, type Clock } from '@/lib/day-words';

import { approvalStanding, type Approval } from './approval';
import { isSameStep, stepWords, type StepAsked } from './step-asked';

/** Whether it keeps the batch here, asks for a second look, or is only good to know. */
export const CHECK_LEVELS = ['stop', 'warn', 'note'] as const;
export type CheckLevel = (typeof CHECK_LEVELS)[number];

/** What the person can do about it, in place. */
export const WAYS_OUT = [
  'override',
  'take_out_line',
  'add_lot',
  'set_days',
  'set_prices',
  'set_requirements',
  'choose_processor',
  'see_processor',
  'take_up',
] as const;
export interface WayOut {
  way: (typeof WAYS_OUT)[number];
  says: string;
  lineId?: string;
}

export interface Finding {
  code: string;
  level: CheckLevel;
  /** What exactly it is about: empty for the batch, else the id of the line or processor. With the code it names the finding. */
  subject: string;
  sentence: string;
  rest: string;
  source?: string;
  waysOut: readonly WayOut[];
}

export interface CheckFacts extends Clock {
  batch: StepAsked & {
    number: string;
    wantedBackOn: CalendarDay | null;
    leavesOn: CalendarDay | null;
    putAsideAt: Date | null;
    lotMinimumMinor: number;
    certificationFeeMinor: number;
    /** Requirements that hold for all lines. */
    requirements: number;
  };
  today: CalendarDay;
  processor: { id: string; name: string; active: boolean; approvals: readonly Approval[] };
  lines: readonly CheckedLine[];
}

export interface CheckedLine {
  id: string;
  lineNo: number;
  lotNumber: string;
  partNumber: string;
  partRevision: string;
  partSuperseded: boolean;
  step: StepAsked;
  unitPriceMinor: number;
  requirements: number;
}

/** One question to a batch before it leaves: what is wrong, or in a few words what is right. */
interface Check {
  met: string;
  look(facts: CheckFacts): readonly Finding[];
}

const OVERRIDE: WayOut = { way: 'override', says: 'Override' };

const hasLines: Check = {
  met: 'it has lines',
  look: ({ lines, batch }) =>
    lines.length > 0
      ? []
      : [
          {
            code: 'empty_batch',
            level: 'stop',
            subject: '',
            sentence: 'Nothing is in it.',
            rest: `${batch.number} has no line. Add a lot that waits for a step.`,
            waysOut: [{ way: 'add_lot', says: 'Add a lot' }],
          },
        ],
};

const worksForUs: Check = {
  met: 'you work with the processor',
  look: ({ processor }) =>
    processor.active
      ? []
      : [
          {
            code: 'processor_inactive',
            level: 'stop',
            subject: processor.id,
            sentence: `You no longer work with ${processor.name}.`,
            rest: 'Choose another processor, or take this one up again.',
            waysOut: [
              { way: 'choose_processor', says: 'Choose another' },
              { way: 'see_processor', says: 'See the processor' },
            ],
          },
        ],
};

const isApproved: Check = {
  met: 'the processor is approved for this step today',
  look(facts) {
    const { batch, processor, today } = facts;
    const standing = approvalStanding(processor.approvals, { ...batch, on: today });
    if (standing.state === 'approved') return [];
    const day = (when: CalendarDay | Date) => dayWords(when, facts);
    const why = {
      none: ['is not approved for this.', `No approval names ${stepWords(batch)}.`],
      expired: [
        'is no longer approved.',
        standing.state === 'none'
          ? ''
          : `Approval ${standing.approval.reference} ended ${day(standing.approval.validTo)}.`,
      ],
      not_yet: [
        'is not approved yet.',
        standing.state === 'none'
          ? ''
          : `Approval ${standing.approval.reference} begins ${day(standing.approval.validFrom)}.`,
      ],
      withdrawn: [
        'is no longer approved.',
        standing.state === 'none'
          ? ''
          : `Approval ${standing.approval.reference} was withdrawn${standing.approval.withdrawnAt ? ` ${day(standing.approval.withdrawnAt)}` : ''}.`,
      ],
    }[standing.state];
    return [
      {
        code: 'processor_not_approved',
        level: 'stop',
        subject: processor.id,
        sentence: `${processor.name} ${why[0]}`,
        rest: why[1] ?? '',
        source:
          standing.state === 'none' ? 'Your list of approvals' : `Approval ${standing.approval.reference}`,
        waysOut: [
          { way: 'choose_processor', says: 'Choose another' },
          { way: 'see_processor', says: 'See the approvals' },
          OVERRIDE,
        ],
      },
    ];
  },
};

const isApprovedUntilBack: Check = {
  met: 'the approval lasts until the pieces are wanted back',
  look(facts) {
    const { batch, processor, today } = facts;
    const standing = approvalStanding(processor.approvals, { ...batch, on: today });
    if (
      standing.state !== 'approved' ||
      batch.wantedBackOn === null ||
      standing.approval.validTo > batch.wantedBackOn
    )
      return [];
    const sameDay = standing.approval.validTo === batch.wantedBackOn;
    return [
      {
        code: 'approval_ends_before_back',
        level: 'warn',
        subject: processor.id,
        sentence: `${processor.name} is approved to ${dayWords(standing.approval.validTo, facts)},`,
        rest: sameDay
          ? 'the day you want the pieces back.'
          : `you want the pieces back ${dayWords(batch.wantedBackOn, facts)}.`,
        source: `Approval ${standing.approval.reference}`,
        waysOut: [{ way: 'set_days', says: 'Change the day' }],
      },
    ];
  },
};

const isOneStep: Check = {
  met: 'every line waits for this one step',
  look: ({ batch, lines }) =>
    lines
      .filter((line) => !isSameStep(line.step, batch))
      .map((line) => ({
        code: 'line_of_other_step',
        level: 'stop' as const,
        subject: line.id,
        sentence: `Line ${line.lineNo} is of another step.`,
        rest: `The route of ${line.partNumber} rev ${line.partRevision} says ${stepWords(line.step)}; this batch is ${stepWords(batch)}.`,
        source: `Route of ${line.partNumber}`,
        waysOut: [
          { way: 'take_out_line' as const, says: `Take line ${line.lineNo} out`, lineId: line.id },
          OVERRIDE,
        ],
      })),
};

const isProvable: Check = {
  met: 'each line says what must be proved',
  look: ({ batch, lines }) =>
    batch.requirements > 0
      ? []
      : lines
          .filter((line) => line.requirements === 0)
          .map((line) => ({
            code: 'no_requirement',
            level: 'warn' as const,
            subject: line.id,
            sentence: `Line ${line.lineNo} asks for no proof.`,
            rest: 'Nothing will be compared when its certificate comes.',
            source: `Route of ${line.partNumber}, step as drawn`,
            waysOut: [{ way: 'set_requirements' as const, says: 'Say what must be proved', lineId: line.id }],
          })),
};

const isCurrent: Check = {
  met: 'no drawing is superseded',
  look: ({ lines }) =>
    lines
      .filter((line) => line.partSuperseded)
      .map((line) => ({
        code: 'part_superseded',
        level: 'warn' as const,
        subject: line.id,
        sentence: `Line ${line.lineNo} is made to a superseded drawing.`,
        rest: `A later revision of ${line.partNumber} than ${line.partRevision} exists.`,
        source: `Revisions of ${line.partNumber}`,
        waysOut: [{ way: 'take_out_line' as const, says: `Take line ${line.lineNo} out`, lineId: line.id }],
      })),
};

const hasDay: Check = {
  met: 'the day you want it back is said and ahead',
  look(facts) {
    const { wantedBackOn } = facts.batch;
    const waysOut: WayOut[] = [{ way: 'set_days', says: 'Set the day' }];
    if (wantedBackOn === null)
      return [
        {
          code: 'no_wanted_day',
          level: 'warn',
          subject: '',
          sentence: 'No day is asked for.',
          rest: 'The processor will not know when you want the pieces back.',
          waysOut,
        },
      ];
    if (daysUntil(wantedBackOn, facts) > 0) return [];
    return [
      {
        code: 'wanted_day_past',
        level: 'warn',
        subject: '',
        sentence: 'The day you want it back is here.',
        rest: `It says ${dayWords(wantedBackOn, facts)}.`,
        waysOut,
      },
    ];
  },
};

const hasPrice: Check = {
  met: 'the order states prices',
  look({ batch, lines }) {
    const waysOut: WayOut[] = [{ way: 'set_prices', says: 'Set prices' }];
    const unpriced = lines.filter((line) => line.unitPriceMinor === 0);
    if (unpriced.length === 0) return [];
    if (unpriced.length < lines.length) {
      const numbers = unpriced.map((line) => line.lineNo).join(', ');
      return [
        {
          code: 'line_without_price',
          level: 'note',
          subject: '',
          sentence: `${unpriced.length === 1 ? `Line ${numbers} has` : `Lines ${numbers} have`} no price.`,
          rest: 'The order counts them as nothing.',
          waysOut,
        },
      ];
    }
    if (batch.lotMinimumMinor > 0) return [];
    return [
      {
        code: 'no_price',
        level: 'warn',
        subject: '',
        sentence: 'The order states no price.',
        rest: 'An invoice will have nothing to be compared with.',
        waysOut,
      },
    ];
  },
};

const isTakenUp: Check = {
  met: 'it is not put aside',
  look: (facts) =>
    facts.batch.putAsideAt === null
      ? []
      : [
          {
            code: 'put_aside',
            level: 'note',
            subject: '',
            sentence: `It was put aside ${dayWords(facts.batch.putAsideAt, facts)}.`,
            rest: 'Dispatching it takes it up again.',
            waysOut: [{ way: 'take_up', says: 'Take it up' }],
          },
        ],
};

/** The order they are shown in within their level. Rules of the trade join this list with the trade library. */
const CHECKS: readonly Check[] = [
  hasLines,
  worksForUs,
  isApproved,
  isOneStep,
  isApprovedUntilBack,
  isProvable,
  isCurrent,
  hasDay,
  hasPrice,
  isTakenUp,
];

export interface Checked {
  /** What stops it first, then what warns, then notes. */
  findings: readonly Finding[];
  /** What was looked at and is right, in words. */
  met: readonly string[];
}

/** Looks at a batch before it leaves. */
export function checkBatch(facts: CheckFacts): Checked {
  const looked = CHECKS.map((check) => ({ check, findings: check.look(facts) }));
  const findings = looked.flatMap((one) => one.findings);
  return {
    findings: CHECK_LEVELS.flatMap((level) => findings.filter((finding) => finding.level === level)),
    met: looked.filter((one) => one.findings.length === 0).map((one) => one.check.met),
  };
}

/** An admin may let a blocker pass with a reason where the finding offers it. */
export const canOverride = (finding: Finding): boolean =>
  finding.level === 'stop' && finding.waysOut.some((one) => one.way === 'override');
