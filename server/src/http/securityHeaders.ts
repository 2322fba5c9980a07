import type { RequestHandler } from "express";
import helmet from "helmet";

/** Nothing from anywhere else, and no script but our own files. react-native-web writes its styles inline. */
export function securityHeaders(publicUrl: string): RequestHandler {
  const isHttps = new URL(publicUrl).protocol === "https:";
  return helmet({
    contentSecurityPolicy: {
      useDefaults: false,
      directives: {
        defaultSrc: ["'self'"],
        scriptSrc: ["'self'"],
        styleSrc: ["'self'", "'unsafe-inline'"],
        imgSrc: ["'self'", "data:", "blob:"],
        fontSrc: ["'self'"],
        connectSrc: ["'self'"],
        workerSrc: ["'self'", "blob:"],
        objectSrc: ["'none'"],
        baseUri: ["'none'"],
        formAction: ["'self'"],
        frameAncestors: ["'none'"],
      },
    },
    strictTransportSecurity: isHttps,
    xFrameOptions: { action: "deny" },
    referrerPolicy: { policy: "no-referrer" },
  });
}
