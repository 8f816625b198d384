/** What the program ends with. */
export const ExitCode = {
  good: 0,
  /** Evaluated, but an output holds an error or a check did not pass. */
  failed: 1,
  /** What was given cannot be read or used, or exceeds a limit of time or size. */
  unusable: 2,
  /** By the person: 128 and the number of the signal, as shells count. */
  interrupted: 130,
} as const;
