// Sessions are kept in PostgreSQL, so that any number of server processes share them and a restart ends none.

import connectPgSimple from "connect-pg-simple";
import type { CookieOptions, RequestHandler, Response } from "express";
import session from "express-session";
import type pg from "pg";

/** A fortnight from signing in. Not renewed by use, so that a request that reads writes nothing. */
const LIFETIME_MS = 14 * 24 * 60 * 60 * 1000;

export interface SessionOptions {
  readonly pool: pg.Pool;
  readonly secret: string;
  readonly publicUrl: string;
}

function sessionCookieName(publicUrl: string): string {
  // A browser takes a __Host- cookie only from this very host over https: no other subdomain can plant one.
  return isHttps(publicUrl) ? "__Host-linkwright" : "linkwright";
}

export function keepSessions({ pool, secret, publicUrl }: SessionOptions): RequestHandler {
  const Store = connectPgSimple(session);
  return session({
    // The worker sweeps out expired rows: see jobs/sweep.ts.
    store: new Store({ pool, tableName: "sessions", disableTouch: true, pruneSessionInterval: false }),
    name: sessionCookieName(publicUrl),
    secret,
    resave: false,
    saveUninitialized: false,
    cookie: { ...cookieOptions(publicUrl), maxAge: LIFETIME_MS },
    // The proxy in front speaks https, we speak http behind it: PUBLIC_URL says which one people use.
    proxy: isHttps(publicUrl),
  });
}

export function clearSessionCookie(response: Response, publicUrl: string): void {
  response.clearCookie(sessionCookieName(publicUrl), cookieOptions(publicUrl));
}

function cookieOptions(publicUrl: string): CookieOptions & { sameSite: "lax" } {
  return { httpOnly: true, sameSite: "lax", secure: isHttps(publicUrl), path: "/" };
}

function isHttps(publicUrl: string): boolean {
  return new URL(publicUrl).protocol === "https:";
}
