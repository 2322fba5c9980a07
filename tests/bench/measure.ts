// Timing for the bench: CPU time of this process, so that a busy machine disturbs it less than a wall clock.

export interface Timing {
  /** The median of the rounds. */
  readonly secondsPerCall: number;
  readonly rounds: number;
}

/** Runs `work` in rounds of at least `roundSeconds` of CPU time after a warm-up. */
export function timeCalls(work: () => void, { rounds = 7, roundSeconds = 0.3 } = {}): Timing {
  const round = (): number => {
    let calls = 0;
    const start = cpuSeconds();
    let spent = 0;
    do {
      for (let k = 0; k < 10; k++) work();
      calls += 10;
      spent = cpuSeconds() - start;
    } while (spent < roundSeconds);
    return spent / calls;
  };
  round();
  const times = Array.from({ length: rounds }, round).sort((a, b) => a - b);
  return { secondsPerCall: times[Math.floor(rounds / 2)] as number, rounds };
}

function cpuSeconds(): number {
  const { user, system } = process.cpuUsage();
  return (user + system) / 1e6;
}
