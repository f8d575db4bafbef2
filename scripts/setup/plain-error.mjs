// @ts-check

/** An error whose message is all that the person at the terminal needs: it is printed alone, without a stack. */
export class PlainError extends Error {
  /** @param {string} message a whole sentence: what is wrong and what to do */
  constructor(message) {
    super(message);
    this.name = 'PlainError';
  }
}
