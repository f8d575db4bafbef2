/** Why a document or a file cannot be used: the place as a JSON path (`cuts[2].cutter`, `$` for the whole) and a sentence. */
export interface Problem {
  readonly path: string;
  readonly message: string;
}
