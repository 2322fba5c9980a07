// A browser's worth of HTTP: keeps its cookies, and says what our own pages say.

import { CSRF_HEADER, Problem, pathTo, type Route } from "@linkwright/contract";
import { expect } from "vitest";
import type { z } from "zod";
import { PUBLIC_URL } from "./api.ts";

export interface Reply {
  readonly status: number;
  readonly headers: Headers;
  readonly text: string;
  /** The body as JSON; undefined when it is none. */
  readonly json: unknown;
}

export interface SendOptions {
  readonly body?: unknown;
  /** Set beside or over what our own pages send; undefined leaves one out. */
  readonly headers?: Readonly<Record<string, string | undefined>>;
}

export interface Client {
  readonly send: (method: string, path: string, options?: SendOptions) => Promise<Reply>;
  /** Sends what the route asks for, and holds a success to the status and the shape that the route promises. */
  readonly call: <P extends z.ZodType, B extends z.ZodType, A extends z.ZodType>(
    route: Route<P, B, A>,
    params: z.input<P>,
    body?: z.input<B>,
  ) => Promise<z.output<A>>;
  /** The same, expecting to be refused. */
  readonly refused: <P extends z.ZodType, B extends z.ZodType, A extends z.ZodType>(
    route: Route<P, B, A>,
    params: z.input<P>,
    body?: unknown,
  ) => Promise<Problem>;
  readonly cookies: Map<string, string>;
}

export function createClient(url: string): Client {
  const cookies = new Map<string, string>();

  async function send(
    method: string,
    path: string,
    { body, headers = {} }: SendOptions = {},
  ): Promise<Reply> {
    const own: Record<string, string | undefined> = {
      ...(body !== undefined && { "Content-Type": "application/json" }),
      ...(method !== "GET" && { [CSRF_HEADER]: "1", Origin: PUBLIC_URL }),
      ...(cookies.size > 0 && { Cookie: [...cookies].map(([name, value]) => `${name}=${value}`).join("; ") }),
      ...headers,
    };
    const sent = Object.entries(own).filter((entry): entry is [string, string] => entry[1] !== undefined);
    const response = await fetch(`${url}${path}`, {
      method,
      headers: sent,
      redirect: "manual",
      ...(body !== undefined && { body: typeof body === "string" ? body : JSON.stringify(body) }),
    });
    keepCookies(cookies, response.headers);
    const text = await response.text();
    return { status: response.status, headers: response.headers, text, json: jsonOf(text) };
  }

  return {
    send,
    cookies,
    async call(route, params, body) {
      const reply = await send(route.method, pathTo(route, params), { body });
      expect(reply.status, reply.text).toBe(route.status);
      return route.status === 204 ? (undefined as never) : route.answer.parse(reply.json);
    },
    async refused(route, params, body) {
      return problemOf(await send(route.method, pathTo(route, params), { body }));
    },
  };
}

/** The problem that the reply is, with a media type and a status that agree with it. */
export function problemOf(reply: Reply): Problem {
  expect(reply.headers.get("content-type"), reply.text).toMatch(/^application\/problem\+json/);
  const problem = Problem.parse(reply.json);
  expect(problem.status).toBe(reply.status);
  expect(problem.requestId).toBe(reply.headers.get("x-request-id"));
  return problem;
}

function keepCookies(cookies: Map<string, string>, headers: Headers): void {
  for (const line of headers.getSetCookie()) {
    const [pair = "", ...attributes] = line.split(/;\s*/);
    const [name = "", value = ""] = pair.split("=", 2);
    const isGone = attributes.some((attribute) => /^Expires=Thu, 01 Jan 1970/.test(attribute));
    if (isGone) cookies.delete(name);
    else cookies.set(name, value);
  }
}

function jsonOf(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
