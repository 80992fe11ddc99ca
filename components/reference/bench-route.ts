/** A step of the bench's route, as it is typed. */
export interface BenchStep {
  /** Empty while none is chosen. */
  readonly process: string;
  /** With its issue: `QQ-P-416F`. */
  readonly specification: string;
  readonly classType: string;
}

export const NO_STEP: BenchStep = { process: '', specification: '', classType: '' };

/** The longest route that is read from an address; real ones have a handful of steps. */
const LONGEST = 20;

/** A route as one word of the address; its two marks cannot be typed into a step. */
export const writeBenchRoute = (route: readonly BenchStep[]): string =>
  route
    .map(({ process, specification, classType }) =>
      [process, specification, classType].map((text) => text.replace(/[~|]/g, ' ')).join('|'),
    )
    .join('~');

/** Reads what `writeBenchRoute` wrote; anything else gives steps without a process. */
export const readBenchRoute = (typed: string): BenchStep[] =>
  typed === ''
    ? []
    : typed
        .split('~')
        .slice(0, LONGEST)
        .map((step) => {
          const [process = '', specification = '', classType = ''] = step.split('|');
          return { process, specification, classType };
        });
