export { startWorker, type Worker, type WorkerOptions } from "./startWorker.ts";
