// Seeds the demo and prints its accounts, one line of JSON each.

import { connect } from "./client.ts";
import { seedDemo } from "./seed/seedDemo.ts";

const url = process.env.DATABASE_URL;
if (!url) {
  console.error("Set DATABASE_URL to the address of the database.");
  process.exit(2);
}
const connection = connect({ url, poolSize: 1 });
try {
  for (const account of await seedDemo(connection.db)) console.log(JSON.stringify(account));
} finally {
  await connection.close();
}
