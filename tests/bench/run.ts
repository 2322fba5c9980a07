// `npm run bench`: prints what was measured on this machine. Figures are never asserted.

import { cpus } from "node:os";
import { workedAxle } from "../helpers/workedAxle.ts";
import { benchPoses } from "./poses.bench.ts";
import { benchStudies } from "./studies.bench.ts";

console.log(`${cpus()[0]?.model ?? "unknown processor"}, ${cpus().length} cores, Node ${process.version}`);
console.log("CPU time of one process, median of rounds after a warm-up.\n");
for (const line of [...benchPoses(workedAxle), ...benchStudies(workedAxle)]) console.log(line);
