/** The surroundings are not as the program needs them; the message lists everything that is wrong. */
export class ConfigError extends Error {
  readonly faults: readonly string[];

  constructor(faults: readonly string[]) {
    super(`The configuration is not usable:\n${faults.map((fault) => `  - ${fault}`).join('\n')}`);
    this.name = 'ConfigError';
    this.faults = faults;
  }
}
