export { type Authenticator, createAuthenticator, signedInPerson } from "./passport.ts";
export { authRouter } from "./routes.ts";
export { createAuthService } from "./service.ts";
