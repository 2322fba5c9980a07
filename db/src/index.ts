export {
  asPerson,
  type Connection,
  type ConnectOptions,
  connect,
  type Db,
  inWorkshop,
  type PersonScope,
  type Tx,
  type WorkshopScope,
} from "./client.ts";
export { hashDocument, isSameDocument } from "./hashDocument.ts";
export { migrateDatabase } from "./migrate.ts";
export { JOB_SCHEMA, QUEUES, SHEET_RETRIES } from "./queues.ts";
export * from "./schema/index.ts";
export { DEMO_ACCOUNTS, type DemoAccount, seedDemo } from "./seed/seedDemo.ts";
