/** Exit codes of the command; scripts rely on them. */
export const exitCodes = { done: 0, internalError: 1, badInput: 2, failOn: 3 } as const;

export type ExitCode = 0 | 1 | 2 | 3 | 4;

/** Exit codes of `gate`, whose outcome they are; what is our own error must not pass for a version that failed. */
export const gateCodes = { passed: 0, failed: 1, undecided: 3, internalError: 4 } as const;

/** Bad input or options: the lines go to standard error, and the command ends with code 2. */
export class Refusal extends Error {
  constructor(readonly lines: string[]) {
    super(lines.join('\n'));
  }
}
