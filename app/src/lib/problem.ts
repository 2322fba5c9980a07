// Everything that can go wrong between the app and its server, as one error type, and what to say about it.

import type { DraftConflict, ProblemCode, ProblemIssue } from "@linkwright/contract";

/** The server's own codes, and what happens when no answer of ours comes back. */
export type ProblemKind = ProblemCode | "offline" | "timeout" | "unreachable" | "unexpected_answer";

interface ProblemFacts {
  readonly kind: ProblemKind;
  readonly title: string;
  readonly detail: string;
  readonly issues?: readonly ProblemIssue[] | undefined;
  readonly conflict?: DraftConflict | undefined;
  readonly retryAfterSeconds?: number | undefined;
  readonly requestId?: string | undefined;
}

export class ApiProblem extends Error {
  override readonly name = "ApiProblem";
  readonly kind: ProblemKind;
  readonly title: string;
  readonly issues: readonly ProblemIssue[];
  readonly conflict: DraftConflict | undefined;
  readonly retryAfterSeconds: number | undefined;
  readonly requestId: string | undefined;

  constructor(facts: ProblemFacts) {
    super(facts.detail);
    this.kind = facts.kind;
    this.title = facts.title;
    this.issues = facts.issues ?? [];
    this.conflict = facts.conflict;
    this.retryAfterSeconds = facts.retryAfterSeconds;
    this.requestId = facts.requestId;
  }
}

export function isProblem(error: unknown, ...kinds: readonly ProblemKind[]): error is ApiProblem {
  return error instanceof ApiProblem && (kinds.length === 0 || kinds.includes(error.kind));
}

/** Nothing is wrong with the request itself: sent again later, it may well succeed. */
export function isPassing(error: unknown): boolean {
  return isProblem(error, "offline", "timeout", "unreachable", "unavailable");
}

export interface Explanation {
  readonly title: string;
  readonly detail: string;
  /** What the person can do, where the detail does not say it already. */
  readonly advice: string | undefined;
  /** To be told when asking for help. */
  readonly reference: string | undefined;
}

/** The server's own details end in what to do; only what this side knows better is added. */
const ADVICE: Partial<Record<ProblemKind, string>> = {
  not_signed_in: "What you typed is kept.",
  not_found: "Check the address, or go back to the builds.",
  id_reused: "Load this page anew and try again.",
  unavailable: "What you typed is kept.",
  internal: "If it stays, tell whoever runs this server the reference.",
  offline: "What you typed is kept on this device. Try again once there is a connection.",
  timeout: "What you typed is kept. Try again.",
  unreachable: "What you typed is kept. Try again in a moment.",
  unexpected_answer: "Load this page anew: a newer version may have come out.",
};

export function explain(error: unknown): Explanation {
  if (error instanceof ApiProblem) {
    const wait = error.retryAfterSeconds;
    const advice = wait === undefined ? ADVICE[error.kind] : `Try again in ${waitInWords(wait)}.`;
    return { title: error.title, detail: error.message, advice, reference: error.requestId };
  }
  return {
    title: "Something went wrong on this page",
    detail: error instanceof Error ? error.message : "The cause is not known.",
    advice: "Load the page anew. If it stays, tell whoever runs this server what you did.",
    reference: undefined,
  };
}

function waitInWords(seconds: number): string {
  if (seconds < 90) return `${Math.max(1, seconds)} seconds`;
  return `${Math.ceil(seconds / 60)} minutes`;
}
