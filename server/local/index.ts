// What the test runner uses of the local set-up.
export { type Context, PlainProblem } from "./context.ts";
export { createHeld, endOfLog, freePort, type Held, runToEnd } from "./processes.ts";
export { type Running, type Settings, startServices } from "./services.ts";
export { buildWeb } from "./webBuild.ts";
