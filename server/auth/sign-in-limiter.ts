import type pg from 'pg';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { Problem } from '../http/problem.ts';

/** Failures are counted in PostgreSQL, so that any number of processes count together. */
export interface SignInLimiter {
  /** @throws Problem too-many with the seconds to wait. */
  mayTry(signIn: string, ip: string): Promise<void>;
  /** Runs the sign-in; a failure counts against name and address, success clears the name. */
  counting<T>(signIn: string, ip: string, work: () => Promise<T>): Promise<T>;
}

/** Ten failures on a name in a quarter of an hour, a hundred from an address; then wait, never a lasting lock. */
export function signInLimiter(pool: pg.Pool): SignInLimiter {
  const common = { storeClient: pool, tableName: 'rate_limit', tableCreated: true, duration: 900 } as const;
  const byName = new RateLimiterPostgres({ ...common, keyPrefix: 'sign-in-name', points: 10 });
  const byAddress = new RateLimiterPostgres({ ...common, keyPrefix: 'sign-in-address', points: 100 });
  const nameKey = (signIn: string) => signIn.trim().toLowerCase().slice(0, 200);

  return {
    async mayTry(signIn, ip) {
      const [name, address] = await Promise.all([byName.get(nameKey(signIn)), byAddress.get(ip)]);
      for (const [limiter, state] of [
        [byName, name],
        [byAddress, address],
      ] as const) {
        if (state !== null && state.consumedPoints >= limiter.points) {
          const seconds = Math.max(1, Math.ceil(state.msBeforeNext / 1000));
          throw new Problem(
            'too-many',
            `Too many tries. Wait ${Math.ceil(seconds / 60)} min and try again.`,
            {
              retryAfter: seconds,
            },
          );
        }
      }
    },
    async counting(signIn, ip, work) {
      try {
        const result = await work();
        await byName.delete(nameKey(signIn));
        return result;
      } catch (error) {
        if (error instanceof Problem && error.kind === 'signed-out') {
          await Promise.all(
            [byName.consume(nameKey(signIn)), byAddress.consume(ip)].map((counted) =>
              counted.catch((refused: unknown) => {
                // The limiter rejects with its own result once the count is full; that is the count working.
                if (!(refused instanceof RateLimiterRes)) throw refused;
              }),
            ),
          );
        }
        throw error;
      }
    },
  };
}
