// The guard against cross-site request forgery. Three locks, because each alone has a known gap:
// - the session cookie is SameSite=Lax (session.ts), but a sibling subdomain counts as the same site;
// - Origin and Sec-Fetch-Site say where a request was made, but a browser may leave them out;
// - a header of our own cannot be set by a form or a link, and a script of another origin may only set it after a
//   preflight that we never allow; it is the lock that is always there.
// A hidden token in each form would add nothing to these, and our client has no server-rendered forms to put it in.

import { CSRF_HEADER } from "@linkwright/contract";
import type { Request, RequestHandler } from "express";
import { ServiceError } from "./problems.ts";

const SAFE_METHODS = new Set(["GET", "HEAD", "OPTIONS"]);

export function requireSameOrigin(publicUrl: string): RequestHandler {
  const ownOrigin = new URL(publicUrl).origin;
  return (request, _response, next) => {
    if (!SAFE_METHODS.has(request.method) && !isOurs(request, ownOrigin)) {
      throw new ServiceError("foreign_request");
    }
    next();
  };
}

function isOurs(request: Request, ownOrigin: string): boolean {
  if (request.get(CSRF_HEADER) === undefined) return false;
  const site = request.get("Sec-Fetch-Site");
  if (site !== undefined && site !== "same-origin") return false;
  const origin = request.get("Origin");
  if (origin === undefined || origin === ownOrigin) return true;
  // In development the page comes from another port that passes /api on, with the Host the browser asked for.
  return URL.canParse(origin) && new URL(origin).host === request.get("Host");
}
