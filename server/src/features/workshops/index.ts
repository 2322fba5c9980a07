export { findRole, getWorkshopName } from "./repo.ts";
export { workshopsRouter } from "./routes.ts";
