import { dayWords, type CalendarDay } from '@/lib/day-words';

import { approvalStanding } from './approval';
import type { Check } from './check';
import { OVERRIDE } from './finding';
import { stepWords } from './step-asked';

export const worksForUs: Check = {
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

export const isApproved: Check = {
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

export const isApprovedUntilBack: Check = {
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
