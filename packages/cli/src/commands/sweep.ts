// `linkwright sweep FILE`: rows over travel and steer.

import { type Axle, type Sweep, steeringLock, steeringUnit, sweepAxle } from "@linkwright/kinematics";
import { Command, Option } from "commander";
import { BadInput } from "../badInput.ts";
import { parseList, parseNumber, parseRange } from "../ranges.ts";
import { readAxle } from "../readDocument.ts";
import { sweepCsv } from "../sweepCsv.ts";

interface SweepOptions {
  readonly travel: number[];
  readonly steer: number[];
  readonly wheelUp: number;
  readonly format: "json" | "csv";
}

export function sweepCommand(): Command {
  return new Command("sweep")
    .description("Both wheels and the axle over wheel travel and steering.")
    .argument("<file>", "axle or study document (JSON)")
    .requiredOption("--travel <FROM:TO:STEP>", "wheel travel from design, mm, bump positive", parseRange)
    .option("--steer <LIST>", "rack travel, mm, positive to the left: 0 or -40,0,40", parseList, [0])
    .option("--wheel-up <MM>", "travel from design at which toe is set with the tie rod", parseNumber, 0)
    .addOption(new Option("--format <KIND>", "what to print").choices(["json", "csv"]).default("json"))
    .action(runSweep);
}

async function runSweep(file: string, options: SweepOptions): Promise<void> {
  const axle = await readAxle(file);
  refuseSteer(axle, options.steer);
  warnBeyondLock(axle, options.steer);
  const { travel: travels, steer: steers, wheelUp } = options;
  const sweep = sweepAxle(axle, { travels, steers, wheelUp });
  process.stdout.write(options.format === "csv" ? sweepCsv(sweep) : `${JSON.stringify(sweep)}\n`);
  if (sweep.rows.length > 0) return;
  process.stderr.write(`${nothingSolved(sweep)}\n`);
  process.exitCode = 1;
}

function refuseSteer(axle: Axle, steers: readonly number[]): void {
  if (steeringUnit(axle.steering) !== null || steers.every((steer) => steer === 0)) return;
  throw new BadInput([
    "--steer: this axle has a fixed toe link and cannot be steered. Leave it out, or give 0.",
  ]);
}

function warnBeyondLock(axle: Axle, steers: readonly number[]): void {
  const lock = steeringLock(axle.steering);
  const beyond = steers.filter((steer) => Math.abs(steer) > lock);
  if (beyond.length === 0) return;
  const unit = steeringUnit(axle.steering);
  process.stderr.write(`Beyond the steering's travel of ±${lock} ${unit}: ${beyond.join(", ")}.\n`);
}

function nothingSolved(sweep: Sweep): string {
  const ends = sweep.ends.map(({ side, steer, lastTravel, link }) => {
    const where = lastTravel === null ? `steer ${steer} is out of reach` : `the last travel is ${lastTravel}`;
    return `${side}: ${where}, held by ${link}`;
  });
  return `No row could be solved. ${ends.join("; ")}.`;
}
