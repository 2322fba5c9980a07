// Errors → RFC 9457 problem details. The only place that knows which status stands for what.

import type { DraftConflict, Problem, ProblemCode, ProblemIssue } from "@linkwright/contract";
import type { ErrorRequestHandler, Response } from "express";
import { describeError, type Log } from "../log.ts";
import { isDatabaseAway, postgresCode } from "./databaseErrors.ts";
import { presentIssue } from "./issues.ts";
import { requestId } from "./requestId.ts";

export interface ServiceErrorDetails {
  readonly detail?: string;
  readonly issues?: readonly ProblemIssue[];
  readonly conflict?: DraftConflict;
  readonly retryAfterSeconds?: number;
}

/** What a service throws when it cannot do what was asked. */
export class ServiceError extends Error {
  override name = "ServiceError";
  readonly code: ProblemCode;
  readonly details: ServiceErrorDetails;

  constructor(code: ProblemCode, details: ServiceErrorDetails = {}) {
    super(details.detail ?? PROBLEMS[code].detail);
    this.code = code;
    this.details = details;
  }
}

interface ProblemText {
  readonly status: number;
  readonly title: string;
  readonly detail: string;
}

const PROBLEMS: Readonly<Record<ProblemCode, ProblemText>> = {
  invalid: {
    status: 400,
    title: "Something in the request is not right",
    detail: "Mend what is listed and send it again.",
  },
  study_refused: {
    status: 422,
    title: "The study is not possible like this",
    detail: "Nothing was saved. Mend what is listed and save again.",
  },
  not_signed_in: {
    status: 401,
    title: "You are not signed in",
    detail: "Sign in and try again.",
  },
  wrong_credentials: {
    status: 401,
    title: "That did not sign you in",
    detail: "The e-mail address or the password is wrong.",
  },
  not_allowed: {
    status: 403,
    title: "Not allowed",
    detail: "Your role in this workshop does not include this. Ask an owner of the workshop.",
  },
  foreign_request: {
    status: 403,
    title: "This request did not come from Linkwright's own pages",
    detail: "Open Linkwright by its own address and try again there.",
  },
  not_found: {
    status: 404,
    title: "Not found",
    detail: "There is nothing here, or it belongs to another workshop.",
  },
  edit_conflict: {
    status: 409,
    title: "Someone else changed the same thing",
    detail: "Nothing was saved. Choose between the two values, and save again on the draft's new version.",
  },
  draft_moved: {
    status: 409,
    title: "The draft has changed since you looked at it",
    detail: "Look at the draft as it is, and save the revision again.",
  },
  id_reused: {
    status: 409,
    title: "This id already stands for something else",
    detail: "Make a new id for a new thing; send the same id again only with the same content.",
  },
  sheet_not_ready: {
    status: 409,
    title: "The sheet is not made yet",
    detail: 'Wait until its status is "made".',
  },
  too_large: {
    status: 413,
    title: "Too large",
    detail: "The request is larger than what is taken in one piece.",
  },
  too_many_attempts: {
    status: 429,
    title: "Too many attempts",
    detail: "Wait a while before the next attempt.",
  },
  unavailable: {
    status: 503,
    title: "Not available for the moment",
    detail: "Nothing was lost that had been saved. Try again in a few seconds.",
  },
  internal: {
    status: 500,
    title: "A fault of ours",
    detail: "Something went wrong on our side. Tell us the request id if it happens again.",
  },
};

const RETRY_UNAVAILABLE_SECONDS = 5;

/** The last handler: everything thrown in a request ends here, and nothing of an unknown error goes out. */
export function problemHandler(log: Log): ErrorRequestHandler {
  return (error, request, response, next) => {
    const known = toServiceError(error);
    if (known.code === "internal" || known.code === "unavailable") {
      log.error(`request ${known.code}`, {
        requestId: requestId(response),
        method: request.method,
        path: request.path,
        ...describeError(error),
      });
    }
    // Half of an answer has gone out: all that is left is to break it off, so that nobody takes it for whole.
    if (response.headersSent) next(error);
    else sendProblem(response, known);
  };
}

function sendProblem(response: Response, error: ServiceError): void {
  const { status, title } = PROBLEMS[error.code];
  const { issues, conflict, retryAfterSeconds } = error.details;
  const problem: Problem = {
    type: `urn:linkwright:problem:${error.code}`,
    title,
    status,
    detail: error.message,
    code: error.code,
    requestId: requestId(response),
    ...(issues && { issues: issues.map(presentIssue) }),
    ...(conflict && { conflict }),
    ...(retryAfterSeconds !== undefined && { retryAfterSeconds }),
  };
  if (retryAfterSeconds !== undefined) response.set("Retry-After", String(retryAfterSeconds));
  response.status(status).type("application/problem+json").send(JSON.stringify(problem));
}

function toServiceError(error: unknown): ServiceError {
  if (error instanceof ServiceError) return error;
  if (isDatabaseAway(error)) {
    return new ServiceError("unavailable", { retryAfterSeconds: RETRY_UNAVAILABLE_SECONDS });
  }
  // Two requests made the same id at the same moment: a repeat of either one finds what is there.
  if (postgresCode(error) === "23505") return new ServiceError("id_reused");
  return fromExpress(error) ?? new ServiceError("internal");
}

/** What Express and its body parser refuse by themselves, before any handler of ours has seen the request. */
function fromExpress(error: unknown): ServiceError | null {
  if (!(error instanceof Error) || !("status" in error) || typeof error.status !== "number") return null;
  if (error.status === 413) return new ServiceError("too_large");
  if ("type" in error && error.type === "entity.parse.failed") {
    return new ServiceError("invalid", { detail: "The body is not JSON." });
  }
  // A path whose escapes cannot be read leads nowhere.
  if (error instanceof URIError) return new ServiceError("not_found");
  if (error.status >= 400 && error.status < 500) {
    return new ServiceError("invalid", { detail: "The request could not be read. Send JSON in UTF-8." });
  }
  return null;
}
