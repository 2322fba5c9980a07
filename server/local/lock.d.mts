export type LockHolder = { readonly pid: number; readonly url?: string; readonly webFolder?: string };

export type HeldLock = {
  /** Whether a dead holder's file was cleared away. */
  readonly stale: boolean;
  describe(facts: Omit<LockHolder, "pid">): void;
  release(): void;
};

export function processBegan(pid: number): number | null;
export function readLock(path: string): LockHolder | null;
export function holdLock(path: string, explain: (holder: LockHolder) => string): HeldLock;
