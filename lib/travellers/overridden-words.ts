/** What a blocker that was let pass says on paper. */
export const OVERRIDDEN_WORDS: Readonly<Record<string, string>> = {
  processor_not_approved: 'sent although no approval for this step stands today',
  line_of_other_step: 'sent although its route says another step',
};
