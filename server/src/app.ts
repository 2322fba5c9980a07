// Builds the web process's Express app. It never listens: main.ts does, and tests do on ports of their own.

import type { Connection } from "@linkwright/db";
import express, { type Express, type RequestHandler, Router } from "express";
import {
  type Authenticator,
  authRouter,
  createAuthenticator,
  createAuthService,
  signedInPerson,
} from "./features/auth/index.ts";
import { buildsRouter } from "./features/builds/index.ts";
import { commentsRouter } from "./features/comments/index.ts";
import { revisionsRouter } from "./features/revisions/index.ts";
import { sheetsRouter } from "./features/sheets/index.ts";
import { studiesRouter } from "./features/studies/index.ts";
import { findRole, workshopsRouter } from "./features/workshops/index.ts";
import type { Storage } from "./files/storage.ts";
import { healthRouter } from "./http/health.ts";
import { problemHandler, ServiceError } from "./http/problems.ts";
import { ATTEMPT_LIMITS, type AttemptLimits, createAttempts } from "./http/rateLimits.ts";
import { nameRequest } from "./http/requestId.ts";
import { requireSameOrigin } from "./http/sameOrigin.ts";
import { securityHeaders } from "./http/securityHeaders.ts";
import { createServe } from "./http/serve.ts";
import { keepSessions } from "./http/session.ts";
import { webClient } from "./http/webClient.ts";
import { createJobQueue } from "./jobs/queue.ts";
import type { Log } from "./log.ts";
import type { MailSettings } from "./mail/index.ts";

export interface AppOptions {
  readonly connection: Connection;
  readonly storage: Storage;
  readonly mail: MailSettings;
  readonly sessionSecret: string;
  /** Without it only the API is served. */
  readonly webDir?: string | undefined;
  readonly trustedProxies?: number;
  readonly attemptLimits?: AttemptLimits;
  readonly log: Log;
}

const LARGEST_BODY = "1mb";

export function createApp(options: AppOptions): Express {
  const { connection, mail, webDir, trustedProxies = 0, log } = options;
  const authenticator = createAuthenticator(connection.db);
  const app = express();
  app.disable("x-powered-by");
  app.set("trust proxy", trustedProxies);
  app.use(nameRequest, securityHeaders(mail.publicUrl), healthRouter(connection.db));
  app.use("/api", ...beforeApi(options, authenticator));
  app.use(apiRouter(options, authenticator));
  app.use("/api", nothingHere);
  if (webDir !== undefined) app.use(webClient(webDir));
  app.use(nothingHere, problemHandler(log));
  return app;
}

/** Sessions live below /api only: the client's files are served without asking PostgreSQL. */
function beforeApi(options: AppOptions, authenticator: Authenticator): RequestHandler[] {
  const { connection, mail, sessionSecret } = options;
  return [
    (_request, response, next) => {
      response.set("Cache-Control", "no-store");
      next();
    },
    requireSameOrigin(mail.publicUrl),
    express.json({ limit: LARGEST_BODY }),
    keepSessions({ pool: connection.pool, secret: sessionSecret, publicUrl: mail.publicUrl }),
    signedInPerson(authenticator),
  ];
}

function apiRouter(options: AppOptions, authenticator: Authenticator): Router {
  const { connection, storage, mail, attemptLimits = ATTEMPT_LIMITS } = options;
  const { db, pool } = connection;
  const serve = createServe({ db, findRole });
  const router = Router();
  router.use(
    authRouter(serve, {
      auth: createAuthService({ db, mail }),
      authenticator,
      attempts: createAttempts(pool, attemptLimits),
      publicUrl: mail.publicUrl,
    }),
    workshopsRouter(serve),
    buildsRouter(serve),
    studiesRouter(serve),
    revisionsRouter(serve),
    commentsRouter(serve),
    sheetsRouter(serve, { storage, jobs: createJobQueue() }),
  );
  serve.requireAllServed();
  return router;
}

const nothingHere: RequestHandler = () => {
  throw new ServiceError("not_found");
};
