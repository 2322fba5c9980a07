export { findRevision } from "./repo.ts";
export { revisionsRouter } from "./routes.ts";
