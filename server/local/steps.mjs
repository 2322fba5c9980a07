// What the set-up says while it works: one line a step, with the time it took.

/** A problem the person at the keyboard can mend: shown as its message alone, without a stack. */
export class PlainProblem extends Error {
  name = "PlainProblem";
}

export function seconds(milliseconds) {
  return `${(milliseconds / 1000).toFixed(1)} s`;
}

export function createSteps(stop, write = (text) => process.stdout.write(text)) {
  return {
    say: (line) => write(`${line}\n`),
    /** Runs `work` under a line of its own; what `work` returns under `note` stands at the end of that line. */
    async step(title, work) {
      const from = performance.now();
      write(`  ${title} … `);
      try {
        const result = await work();
        const note = result?.note ? `${result.note}, ` : "";
        write(`${note}${seconds(performance.now() - from)}\n`);
        return result;
      } catch (error) {
        write(`${stop.aborted ? "stopped" : "failed"} after ${seconds(performance.now() - from)}\n`);
        throw error;
      }
    },
  };
}
