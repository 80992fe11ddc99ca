/** What a refusal is. Each has one HTTP status, in `app/_kit/problem.ts`. */
export type ErrorCode =
  | 'bad_input'
  | 'not_signed_in'
  | 'not_allowed'
  | 'not_found'
  | 'conflict'
  | 'gone'
  | 'too_large'
  | 'too_many'
  | 'unavailable';

/** One field that is wrong, by its path in the input (`lines.2.pieces`), in the person's words. */
export interface FieldError {
  field: string;
  message: string;
}

/** An expected refusal, told to the person. Anything else that is thrown is a bug and is told as such. */
export class AppError extends Error {
  constructor(
    readonly code: ErrorCode,
    message: string,
    readonly details: { fields?: FieldError[]; extra?: Record<string, unknown> } = {},
  ) {
    super(message);
    this.name = 'AppError';
  }
}

/** Not yours and not there are the same sentence. */
export const notFound = (thing: string): AppError =>
  new AppError('not_found', `This ${thing} belongs to another shop, or it does not exist.`);

/** Somebody else saved first. */
export const changedMeanwhile = (thing: string): AppError =>
  new AppError(
    'conflict',
    `Not saved: the ${thing} was changed meanwhile. Look at what it is now, then save again.`,
  );
