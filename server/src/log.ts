// One line of JSON for each thing worth telling. Handed in wherever it is needed, so that tests can listen or be quiet.

import { DrizzleQueryError } from "drizzle-orm/errors";

export type LogFields = Readonly<Record<string, unknown>>;

export interface Log {
  readonly info: (event: string, fields?: LogFields) => void;
  readonly error: (event: string, fields?: LogFields) => void;
}

export function createLog(write: (line: string) => void): Log {
  const line =
    (level: string) =>
    (event: string, fields: LogFields = {}) =>
      write(`${JSON.stringify({ time: new Date().toISOString(), level, event, ...fields })}\n`);
  return { info: line("info"), error: line("error") };
}

export const quietLog: Log = { info: () => {}, error: () => {} };

/** An error with its causes, as much of it as a log should hold. */
export function describeError(error: unknown): LogFields {
  if (!(error instanceof Error)) return { error: String(error) };
  const cause = error.cause === undefined ? {} : { cause: describeError(error.cause) };
  // Its message and its stack repeat the parameters: passwords' hashes, addresses, whole studies.
  if (error instanceof DrizzleQueryError) return { error: "query failed", query: error.query, ...cause };
  return { error: error.message, stack: error.stack, ...cause };
}
