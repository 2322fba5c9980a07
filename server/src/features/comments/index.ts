export { commentsRouter } from "./routes.ts";
