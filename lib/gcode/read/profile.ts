/** Which controller's rules a program is read by; `any` takes the whole subset that this reader knows. */
export type ReadDialect = 'any' | 'grbl' | 'linuxcnc' | 'iso';

export interface Profile {
  /** Words (`G81`, `M6`) that this controller does not have. */
  readonly unknown: ReadonlySet<string>;
  readonly percent: boolean;
  readonly programNumber: boolean;
  /** Longest line without blanks and comments, or null. */
  readonly lineLength: number | null;
}

const NONE: ReadonlySet<string> = new Set();

/** Grbl 1.1 documentation; LinuxCNC G-code overview; ISO 6983 by common practice. */
export const PROFILES: Readonly<Record<ReadDialect, Profile>> = {
  any: { unknown: NONE, percent: true, programNumber: true, lineLength: null },
  grbl: {
    unknown: new Set(['G43', 'G61', 'G64', 'G81', 'G83', 'G90.1', 'G98', 'G99', 'M6', 'M48', 'M49']),
    percent: false,
    programNumber: false,
    lineLength: 80,
  },
  linuxcnc: { unknown: NONE, percent: true, programNumber: false, lineLength: null },
  iso: {
    unknown: new Set(['G90.1', 'G91.1', 'G61', 'G64']),
    percent: true,
    programNumber: true,
    lineLength: null,
  },
};
