import { authRoutes } from "@linkwright/contract";
import type { Db } from "@linkwright/db";
import { Router } from "express";
import type { Attempts } from "../../http/rateLimits.ts";
import type { Serve } from "../../http/serve.ts";
import { clearSessionCookie } from "../../http/session.ts";
import type { MailSettings } from "../../mail/index.ts";
import { type Authenticator, signIn, signOut } from "./passport.ts";
import { changeMe, getMe, signUp } from "./service.ts";

export interface AuthOptions {
  readonly db: Db;
  readonly authenticator: Authenticator;
  readonly attempts: Attempts;
  readonly mail: MailSettings;
}

export function authRouter(serve: Serve, options: AuthOptions): Router {
  const { db, authenticator, attempts, mail } = options;
  const router = Router();

  serve.open(router, authRoutes.signUp, async ({ body, request }) => {
    await attempts.countSignUp(request.ip ?? "", body.email);
    await signUp(db, mail, body);
    return { email: body.email };
  });

  serve.open(router, authRoutes.signIn, async ({ body, request }) => {
    const address = request.ip ?? "";
    await attempts.countSignIn(address, body.email);
    // The strategy reads the request's own body: it gets the parsed one, and nothing else.
    request.body = body;
    const personId = await signIn(authenticator, request);
    await attempts.forgiveSignIn(address, body.email);
    return getMe(db, personId);
  });

  serve.open(router, authRoutes.signOut, async ({ request, response }) => {
    await signOut(request);
    clearSessionCookie(response, mail.publicUrl);
    return undefined;
  });

  serve.signedIn(router, authRoutes.me, ({ personId }) => getMe(db, personId));
  serve.signedIn(router, authRoutes.changeMe, ({ personId, body }) => changeMe(db, personId, body));
  return router;
}
