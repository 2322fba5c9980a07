// Who a request comes from: passport with a strategy for passwords, its result kept in the session.

import type { Db } from "@linkwright/db";
import type { Request, RequestHandler } from "express";
import passport from "passport";
import { Strategy as LocalStrategy } from "passport-local";
import { ServiceError } from "../../http/problems.ts";
import { verifyCredentials } from "./service.ts";

declare global {
  namespace Express {
    interface User {
      readonly id: string;
    }
  }
}

export type Authenticator = InstanceType<typeof passport.Passport>;

/** One for each app, not passport's own single one, so that several apps can live in a process. */
export function createAuthenticator(db: Db): Authenticator {
  const authenticator = new passport.Passport();
  authenticator.use(
    new LocalStrategy({ usernameField: "email", passwordField: "password" }, (email, password, done) => {
      verifyCredentials(db, { email, password }).then(
        (personId) => done(null, personId === null ? false : { id: personId }),
        (error) => done(error),
      );
    }),
  );
  authenticator.serializeUser<string>((user, done) => done(null, user.id));
  // The id is all that a request needs: whether the person may do something is asked of the membership each time.
  authenticator.deserializeUser<string>((id, done) => done(null, { id }));
  return authenticator;
}

/** Runs the strategy on the request's body. The session is a new one afterwards, so none can be planted before. */
export async function signIn(authenticator: Authenticator, request: Request): Promise<string> {
  const user = await authenticate(authenticator, request);
  if (user === null) throw new ServiceError("wrong_credentials");
  await new Promise<void>((resolve, reject) => {
    request.logIn(user, (error) => (error ? reject(error) : resolve()));
  });
  return user.id;
}

export function signOut(request: Request): Promise<void> {
  return new Promise((resolve, reject) => {
    request.session.destroy((error) => (error ? reject(error) : resolve()));
  });
}

/** Puts the session's person on the request. */
export function signedInPerson(authenticator: Authenticator): RequestHandler {
  return authenticator.session() as RequestHandler; // passport types its middleware loosely; it is (req, res, next)
}

function authenticate(authenticator: Authenticator, request: Request): Promise<Express.User | null> {
  return new Promise((resolve, reject) => {
    const answer = (error: unknown, user: Express.User | false | null | undefined) =>
      error ? reject(error) : resolve(user || null);
    authenticator.authenticate("local", answer)(request, request.res, reject);
  });
}
