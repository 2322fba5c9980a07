export { buildsRouter } from "./routes.ts";
export { getBuild } from "./service.ts";
