export { type Authenticator, createAuthenticator, signedInPerson } from "./passport.ts";
export { authRouter } from "./routes.ts";
