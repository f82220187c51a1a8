/** One step of the schema: SQL to go up, SQL to come back down. Never edited once it has run anywhere. */
export interface Migration {
  readonly name: string;
  readonly up: string;
  readonly down: string;
}
