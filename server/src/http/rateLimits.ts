// How often somebody may try to get in. Counted in PostgreSQL, so that all server processes count together.

import { createHash } from "node:crypto";
import type pg from "pg";
import { RateLimiterPostgres, RateLimiterRes } from "rate-limiter-flexible";
import { ServiceError } from "./problems.ts";

export interface Limit {
  readonly points: number;
  readonly seconds: number;
}

export interface AttemptLimits {
  readonly signInPerAddress: Limit;
  /** Bounds guessing from many addresses. It also lets a stranger keep a person from signing in for a while, never
   *  out of a session that is open. */
  readonly signInPerAccount: Limit;
  readonly signUpPerAddress: Limit;
  /** Bounds how much mail a stranger can have us send to one address. */
  readonly signUpPerAccount: Limit;
}

export const ATTEMPT_LIMITS: AttemptLimits = {
  signInPerAddress: { points: 50, seconds: 15 * 60 },
  signInPerAccount: { points: 10, seconds: 15 * 60 },
  signUpPerAddress: { points: 50, seconds: 60 * 60 },
  signUpPerAccount: { points: 5, seconds: 60 * 60 },
};

export type Attempts = ReturnType<typeof createAttempts>;

export function createAttempts(pool: pg.Pool, limits: AttemptLimits) {
  const limiterOf = (name: keyof AttemptLimits) =>
    new RateLimiterPostgres({
      storeClient: pool,
      storeType: "pool",
      tableName: "rate_limits",
      tableCreated: true,
      // The worker sweeps out old rows: see jobs/sweep.ts.
      clearExpiredByTimeout: false,
      keyPrefix: name,
      points: limits[name].points,
      duration: limits[name].seconds,
    });
  const signInPerAddress = limiterOf("signInPerAddress");
  const signInPerAccount = limiterOf("signInPerAccount");
  const signUpPerAddress = limiterOf("signUpPerAddress");
  const signUpPerAccount = limiterOf("signUpPerAccount");

  return {
    /** Counted before the password is looked at, so that guesses made at once are all counted. */
    async countSignIn(address: string, email: string): Promise<void> {
      await consume(signInPerAddress, address);
      await consume(signInPerAccount, accountKey(email));
    },
    /** Who has got in was not guessing. */
    async forgiveSignIn(address: string, email: string): Promise<void> {
      await signInPerAddress.reward(address);
      await signInPerAccount.delete(accountKey(email));
    },
    async countSignUp(address: string, email: string): Promise<void> {
      await consume(signUpPerAddress, address);
      await consume(signUpPerAccount, accountKey(email));
    },
  };
}

/** What people type into a sign-in form is not kept, not even a wrong address. */
function accountKey(email: string): string {
  return createHash("sha256").update(email).digest("hex");
}

async function consume(limiter: RateLimiterPostgres, key: string): Promise<void> {
  try {
    await limiter.consume(key);
  } catch (refusal) {
    if (!(refusal instanceof RateLimiterRes)) throw refusal;
    const seconds = Math.ceil(refusal.msBeforeNext / 1000);
    throw new ServiceError("too_many_attempts", {
      detail: `Wait ${Math.ceil(seconds / 60)} min before the next attempt.`,
      retryAfterSeconds: seconds,
    });
  }
}
