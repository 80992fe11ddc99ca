/** Something a person has to put right. Its message is one whole sentence; the commands print it without a stack. */
export class CannotStart extends Error {
  override name = 'CannotStart';
}
