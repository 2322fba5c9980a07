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
  /** What the person can do. */
  readonly advice: string;
  /** To be told when asking for help. */
  readonly reference: string | undefined;
}

const ADVICE: Record<ProblemKind, string> = {
  invalid: "Mend what is named and send it again.",
  study_refused: "Put the last change back, or mend what is named.",
  not_signed_in: "Sign in again. What you typed is kept.",
  wrong_credentials: "Check the e-mail address and the password.",
  not_allowed: "Ask the owner of the workshop for the right to do this.",
  foreign_request: "Load this page anew and try again.",
  not_found: "Check the address, or go back to the builds.",
  edit_conflict: "Choose which value stands.",
  draft_moved: "Look at the newer draft, then do it again.",
  id_reused: "Load this page anew and try again.",
  sheet_not_ready: "Wait until it is made, then fetch it.",
  too_large: "Send less at once.",
  too_many_attempts: "Wait a little, then try again.",
  unavailable: "Try again in a moment. What you typed is kept.",
  internal: "Try again. If it stays, tell whoever runs this server the reference.",
  offline: "What you typed is kept on this device. Try again once there is a connection.",
  timeout: "Try again. What you typed is kept.",
  unreachable: "Try again in a moment. What you typed is kept.",
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
