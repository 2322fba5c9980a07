// `npm run dev`: the same data and services as `npm start`, with sources that take effect while it runs.
import { join } from "node:path";
import { choosePlace } from "@linkwright/db/postgres";
import { type Context, columns } from "./context.ts";
import { createHeld, type Held, startService } from "./processes.ts";
import { type Ended, startServices } from "./services.ts";
import { choosePort, holdFolder, showAccounts, waitForEnd } from "./start.ts";

const HOST = "127.0.0.1";
const DEFAULT_API_PORT = 3000;
const DEFAULT_PORT = 8081;

function startBundler(context: Context, held: Held, port: number, apiPort: number): Promise<Ended> {
  const name = "bundler";
  const log = join(context.dataFolder, "logs/bundler.log");
  const bundler = startService({
    name,
    args: [join(context.root, "node_modules/expo/bin/cli"), "start", "--web", "--port", String(port)],
    cwd: join(context.root, "app"),
    env: { API_PORT: String(apiPort), EXPO_OFFLINE: "1", EXPO_NO_TELEMETRY: "1", BROWSER: "none" },
    log,
    echo: "named",
  });
  held.push(bundler.stop);
  return bundler.exited.then((how) => ({ name, how, log }));
}

export async function run(context: Context): Promise<number> {
  const lock = holdFolder(context);
  const held = createHeld();
  try {
    const apiPort = await choosePort("API_PORT", DEFAULT_API_PORT, HOST, "npm run dev");
    const port = await choosePort("PORT", DEFAULT_PORT, HOST, "npm run dev");
    const publicUrl = `http://localhost:${port}`;
    const settings = {
      folder: context.dataFolder,
      place: await choosePlace(context.root, join(context.dataFolder, "postgres")),
      durable: true,
      port: apiPort,
      host: HOST,
      publicUrl,
      watch: true,
    };
    const running = await startServices(settings, context, held);
    const bundlerEnd = startBundler(context, held, port, apiPort);
    lock.describe({ url: publicUrl });
    const addresses = [
      ["Linkwright", `${publicUrl} (the first page takes a while: it is bundled when asked for)`],
      ["Its mail", running.mailUrl],
    ];
    context.say(`\n${columns(addresses)}\n${showAccounts(running)}`);
    return await waitForEnd({ ...running, firstEnd: Promise.race([running.firstEnd, bundlerEnd]) }, context);
  } finally {
    await held.stopAll();
    lock.release();
  }
}
