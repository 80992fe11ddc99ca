import { PROCESS_WORDS, type Process } from '@/lib/trade/process';

/** `solution, quench and age to T42`; without the condition where the lines end in different ones. */
export function askedWords(process: Process, conditions: readonly (string | null)[]): string {
  const [only, ...others] = [...new Set(conditions)];
  return only && others.length === 0 ? `${PROCESS_WORDS[process]} to ${only}` : PROCESS_WORDS[process];
}
