/** Why a program cannot be read: where, and a plain sentence. */
export class ProgramError extends Error {
  override readonly name = 'ProgramError';

  constructor(
    /** 1-based. */
    readonly line: number,
    /** 1-based. */
    readonly column: number,
    readonly sentence: string,
  ) {
    super(`line ${line}, column ${column}: ${sentence}`);
  }
}
