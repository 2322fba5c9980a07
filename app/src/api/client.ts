// The only place that calls fetch. A request follows its route in the contract, and what comes back is parsed by it.

import { CSRF_HEADER, Problem, pathTo, type Route } from "@linkwright/contract";
import type { z } from "zod";
import { ApiProblem } from "@/lib/problem.ts";

const JSON_TYPE = "application/json";
const PROBLEM_TYPE = "application/problem+json";

/** Longer than any answer takes on a bad line; what hangs beyond it is told, not waited for. */
const PATIENCE_MS = 20_000;

interface CallOptions<Params, Body> {
  readonly params: Params;
  readonly body?: Body;
  readonly signal?: AbortSignal | undefined;
}

export async function callApi<P extends z.ZodType, B extends z.ZodType, A extends z.ZodType>(
  route: Route<P, B, A>,
  { params, body, signal }: CallOptions<z.input<P>, z.input<B>>,
): Promise<z.output<A>> {
  const response = await send(pathTo(route, params), route.method, body, signal);
  if (!response.ok) throw await problemOf(response);
  return readAnswer(response, route.answer);
}

/** Where a browser fetches the file of a route by itself, cookies and all. */
export function fileUrl<P extends z.ZodType>(route: Route<P>, params: z.input<P>): string {
  return pathTo(route, params);
}

async function send(
  path: string,
  method: string,
  body: unknown,
  signal: AbortSignal | undefined,
): Promise<Response> {
  const patience = AbortSignal.timeout(PATIENCE_MS);
  try {
    return await fetch(path, {
      method,
      credentials: "same-origin",
      signal: signal ? AbortSignal.any([signal, patience]) : patience,
      headers: {
        accept: `${JSON_TYPE}, ${PROBLEM_TYPE}`,
        [CSRF_HEADER]: "1",
        ...(body === undefined ? {} : { "content-type": JSON_TYPE }),
      },
      ...(body === undefined ? {} : { body: JSON.stringify(body) }),
    });
  } catch (cause) {
    // Given up by us, e.g. because the screen was left: nobody is to be told.
    if (signal?.aborted) throw cause;
    throw unanswered(patience.aborted);
  }
}

function unanswered(timedOut: boolean): ApiProblem {
  if (timedOut) {
    return new ApiProblem({
      kind: "timeout",
      title: "No answer",
      detail: `The server has not answered within ${PATIENCE_MS / 1000} seconds.`,
    });
  }
  if (!navigator.onLine) {
    return new ApiProblem({
      kind: "offline",
      title: "No connection",
      detail: "This device is not connected to a network.",
    });
  }
  return new ApiProblem({
    kind: "unreachable",
    title: "Server not reached",
    detail: "The server cannot be reached from here.",
  });
}

async function problemOf(response: Response): Promise<ApiProblem> {
  const problem = Problem.safeParse(await response.json().catch(() => null));
  if (problem.success) {
    const { code, ...facts } = problem.data;
    return new ApiProblem({ ...facts, kind: code });
  }
  // No words of ours: something in between answered, such as a proxy that has lost its server.
  return response.status >= 500
    ? new ApiProblem({
        kind: "unreachable",
        title: "Server not reached",
        detail: `The server cannot be reached at the moment (${response.status}).`,
      })
    : unexpected(`The server refused the request in a way this page does not know (${response.status}).`);
}

async function readAnswer<A extends z.ZodType>(response: Response, schema: A): Promise<z.output<A>> {
  const isJson = response.headers.get("content-type")?.includes("json") ?? false;
  const content =
    response.status === 204 ? undefined : isJson ? await response.json().catch(() => null) : null;
  const parsed = schema.safeParse(content);
  if (!parsed.success) throw unexpected("The server's answer does not have the form this page knows.");
  return parsed.data;
}

function unexpected(detail: string): ApiProblem {
  return new ApiProblem({ kind: "unexpected_answer", title: "Unexpected answer", detail });
}
