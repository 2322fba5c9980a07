// What a route of the API is: server and client both build on the same description, so that neither can drift.

import { z } from "zod";
import type { Action } from "./policy.ts";

/** Every request that changes something carries this header, with any value: it proves a page of ours sent it. */
export const CSRF_HEADER = "X-Linkwright-Request";

/** Open to all, to whoever is signed in, or to a member of the workshop in the path whose role may do this. */
export type Access = "public" | "signedIn" | Action;

export interface Route<
  Params extends z.ZodType = z.ZodType,
  Body extends z.ZodType = z.ZodType,
  Answer extends z.ZodType = z.ZodType,
> {
  readonly method: "GET" | "POST" | "PATCH";
  /** With `:name` where a parameter goes. */
  readonly path: string;
  readonly access: Access;
  readonly params: Params;
  readonly body: Body;
  readonly answer: Answer;
  /** The status of success. */
  readonly status: 200 | 201 | 202 | 204;
}

export function defineRoute<Params extends z.ZodType, Body extends z.ZodType, Answer extends z.ZodType>(
  route: Route<Params, Body, Answer>,
): Route<Params, Body, Answer> {
  return route;
}

export const NoParams = z.strictObject({});

/** Whatever is sent with a request that has no body is ignored. */
export const NoBody = z.unknown().transform(() => undefined);

/** Answered with 204, or with a file. */
export const NoAnswer = z.undefined();

/** The path with its parameters filled in. */
export function pathTo<Params extends z.ZodType>(
  route: Pick<Route<Params>, "path">,
  params: z.input<Params>,
): string {
  const values = params as Record<string, unknown>;
  return route.path.replace(/:(\w+)/g, (_, name: string) => encodeURIComponent(String(values[name])));
}
