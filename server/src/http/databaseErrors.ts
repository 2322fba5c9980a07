// Telling "the database is away" from "the query is wrong", whoever wrapped the error.

const NETWORK_CODES = new Set([
  "ECONNREFUSED",
  "ECONNRESET",
  "EPIPE",
  "ETIMEDOUT",
  "ENOTFOUND",
  "EHOSTUNREACH",
]);

/** Classes of SQLSTATE that pass by themselves: connection trouble, no resources left, an operator's hand. */
const PASSING_CLASSES = ["08", "53", "57"];

/** pg has no code for these. */
const PASSING_MESSAGES = [
  "Connection terminated",
  "timeout exceeded when trying to connect",
  "Client has encountered a connection error",
  "Cannot use a pool after calling end",
];

export function isDatabaseAway(error: unknown): boolean {
  return chain(error).some((link) => {
    const code = codeOf(link);
    if (code !== null && NETWORK_CODES.has(code)) return true;
    if (code !== null && /^[0-9A-Z]{5}$/.test(code)) return PASSING_CLASSES.includes(code.slice(0, 2));
    return PASSING_MESSAGES.some((message) => link.message.startsWith(message));
  });
}

/** The SQLSTATE, or null when PostgreSQL did not say it. */
export function postgresCode(error: unknown): string | null {
  const codes = chain(error).map(codeOf);
  return codes.find((code) => code !== null && /^[0-9A-Z]{5}$/.test(code)) ?? null;
}

function chain(error: unknown): Error[] {
  const links: Error[] = [];
  let link = error;
  while (link instanceof Error && links.length < 10) {
    links.push(link);
    if (link instanceof AggregateError) links.push(...link.errors.filter((inner) => inner instanceof Error));
    link = link.cause;
  }
  return links;
}

function codeOf(error: Error): string | null {
  return "code" in error && typeof error.code === "string" ? error.code : null;
}
