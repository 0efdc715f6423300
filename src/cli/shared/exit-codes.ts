/** Exit codes of the command; scripts rely on them. */
export const exitCodes = { done: 0, internalError: 1, badInput: 2, failOn: 3 } as const;

export type ExitCode = (typeof exitCodes)[keyof typeof exitCodes];

/** Bad input or options: the lines go to standard error, and the command ends with code 2. */
export class Refusal extends Error {
  constructor(readonly lines: string[]) {
    super(lines.join('\n'));
  }
}
