// `npm test`: every check there is, one after the other, and one line at the end over all of them.
// `npm run e2e`: the end-to-end tests alone; further arguments go to Playwright.
import { type Context, PlainProblem } from "@linkwright/server/local";
import { addTallies, slowestTests, type Tally, tallyOne } from "./run/report.ts";
import { buildWeb, checkStyle, checkTypes, runEndToEnd, runVitest } from "./run/stages.ts";

const SLOWEST = 10;

type Stage = { readonly title: string; run(): Promise<Tally> };

function describeError(error: unknown): string {
  if (error instanceof Error)
    return error.name.endsWith("Problem") ? error.message : (error.stack ?? error.message);
  return String(error);
}

/** A stage that breaks instead of answering counts as one failure. */
async function runStage(stage: Stage, context: Context): Promise<Tally> {
  context.say(`\n── ${stage.title}`);
  const from = performance.now();
  let tally: Tally;
  try {
    tally = await stage.run();
  } catch (error) {
    if (!context.stop.aborted) context.say(describeError(error));
    tally = tallyOne(false);
  }
  const { passed, failed, skipped } = tally;
  const took = ((performance.now() - from) / 1000).toFixed(1);
  context.say(`── ${stage.title}: passed ${passed}, failed ${failed}, skipped ${skipped}, in ${took} s`);
  return tally;
}

function listStages(context: Context): Stage[] {
  const [only, ...extraArgs] = context.args;
  let webFolder: string | null = null;
  const build: Stage = {
    title: "Web client",
    async run() {
      const web = await buildWeb(context);
      context.say(web.note);
      webFolder = web.folder;
      return tallyOne(true);
    },
  };
  const endToEnd: Stage = {
    title: "End-to-end tests",
    async run() {
      if (webFolder === null) throw new PlainProblem("Not run, as there is no web client.");
      return runEndToEnd(context, webFolder, extraArgs);
    },
  };
  if (only === "e2e") return [build, endToEnd];
  return [
    { title: "Types", run: () => checkTypes(context) },
    { title: "Lint and format", run: () => checkStyle(context) },
    { title: "Unit and API tests", run: () => runVitest(context) },
    build,
    endToEnd,
  ];
}

export async function run(context: Context): Promise<number> {
  const tallies: Tally[] = [];
  for (const stage of listStages(context)) {
    if (!context.stop.aborted) tallies.push(await runStage(stage, context));
  }
  const { passed, failed, skipped, tests } = addTallies(tallies);
  context.say(`\nThe ${SLOWEST} slowest tests:\n${slowestTests(tests, SLOWEST).join("\n")}`);
  if (context.stop.aborted) context.say("\nStopped before the end: this was not a full run.");
  context.say(
    `\nIn ${process.uptime().toFixed(0)} s with all set-up:\n${passed} passed, ${failed} failed, ${skipped} skipped`,
  );
  context.stop.throwIfAborted();
  return failed === 0 ? 0 : 1;
}
