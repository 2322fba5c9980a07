export { giveUpSheet, makeSheet } from "./makeSheet.ts";
export { sheetsRouter } from "./routes.ts";
