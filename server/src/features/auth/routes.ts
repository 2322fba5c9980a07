import { authRoutes } from "@linkwright/contract";
import { Router } from "express";
import type { Attempts } from "../../http/rateLimits.ts";
import type { Serve } from "../../http/serve.ts";
import { clearSessionCookie } from "../../http/session.ts";
import { type Authenticator, signIn, signOut } from "./passport.ts";
import type { AuthService } from "./service.ts";

export interface AuthRouterOptions {
  readonly auth: AuthService;
  readonly authenticator: Authenticator;
  readonly attempts: Attempts;
  readonly publicUrl: string;
}

export function authRouter(serve: Serve, options: AuthRouterOptions): Router {
  const { auth, authenticator, attempts, publicUrl } = options;
  const router = Router();

  serve.open(router, authRoutes.signUp, async ({ body, request }) => {
    await attempts.countSignUp(request.ip ?? "", body.email);
    await auth.signUp(body);
    return { email: body.email };
  });

  serve.open(router, authRoutes.signIn, async ({ body, request }) => {
    const address = request.ip ?? "";
    await attempts.countSignIn(address, body.email);
    // The strategy reads the request's own body: it gets the parsed one, and nothing else.
    request.body = body;
    const personId = await signIn(authenticator, request);
    await attempts.forgiveSignIn(address, body.email);
    return auth.getMe(personId);
  });

  serve.open(router, authRoutes.signOut, async ({ request, response }) => {
    await signOut(request);
    clearSessionCookie(response, publicUrl);
    return undefined;
  });

  serve.signedIn(router, authRoutes.me, ({ personId }) => auth.getMe(personId));
  serve.signedIn(router, authRoutes.changeMe, ({ personId, body }) => auth.changeMe(personId, body));
  return router;
}
