import { createHash } from 'node:crypto';
import type { Pool } from 'pg';
import { RateLimiterMemory, RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { Problem } from '#server/errors.ts';
import { networkOf } from './network-of.ts';
import type { LimitName } from './registry.ts';
import { Turns } from './turns.ts';

const seconds = (result: RateLimiterRes): number => Math.max(1, Math.ceil(result.msBeforeNext / 1000));

const tooMany = (wait: number, detail: string) => new Problem(429, 'too-many', detail, { retryAfterSeconds: wait });

/** Requests a minute for one person or, where nobody is signed in, one network. In memory: a second process only doubles a generous number. */
const PER_MINUTE: Record<'general' | LimitName, number> = { general: 300, answers: 60, reports: 20 };

/** Counts a signed-in person's requests. @throws Problem 429 over the limit */
export class RequestLimits {
  readonly #limiters = Object.fromEntries(
    Object.entries(PER_MINUTE).map(([name, points]) => [name, new RateLimiterMemory({ points, duration: 60 })]),
  );

  async count(name: 'general' | LimitName, who: string): Promise<void> {
    try {
      await this.#limiters[name]?.consume(who);
    } catch (refusal) {
      if (!(refusal instanceof RateLimiterRes)) throw refusal;
      throw tooMany(seconds(refusal), 'That was a lot of requests in a minute. Wait a moment, then go on.');
    }
  }
}

const MINUTE = 60;
/** Names and addresses are counted and never kept: the table holds no personal data, and no key is too long. */
const digest = (text: string): string => createHash('sha256').update(text).digest('base64url');

/** Failures from one address with one account, and the wait that follows the last of them. */
const LADDER = [
  { failures: 5, wait: MINUTE },
  { failures: 10, wait: 5 * MINUTE },
  { failures: 15, wait: 15 * MINUTE },
];

/**
 * Slows down guessing. Only failures count, because a whole school shares one address; the owner of an account is
 * slowed and never shut out. Where the counter cannot be reached, sign-in refuses.
 */
export class SignInLimits {
  readonly #pair: RateLimiterPostgres;
  readonly #wait: RateLimiterPostgres;
  readonly #account: RateLimiterPostgres;
  readonly #slow: RateLimiterPostgres;
  readonly #address: RateLimiterPostgres;
  readonly #turns = new Turns();

  constructor(pool: Pool) {
    const limiter = (keyPrefix: string, points: number, duration: number) =>
      new RateLimiterPostgres({
        storeClient: pool,
        storeType: 'pool',
        tableName: 'rate_limit',
        tableCreated: true,
        clearExpiredByTimeout: false,
        keyPrefix,
        points,
        duration,
      });
    this.#pair = limiter('pair', 1_000_000, 60 * MINUTE);
    this.#wait = limiter('wait', 1, MINUTE);
    this.#account = limiter('account', 20, 60 * MINUTE);
    this.#slow = limiter('slow', 1, 30);
    this.#address = limiter('address', 100, 15 * MINUTE);
  }

  /**
   * One try to sign in. Tries at one account come one after the other, so that many at once cannot all pass before
   * the first has failed. @param name account, as typed @param verify answers null for a wrong password
   * @throws Problem 429 with the seconds to wait
   */
  attempt<User>(name: string, from: string, verify: () => Promise<User | null>): Promise<User | null> {
    const account = digest(name);
    const address = digest(networkOf(from));
    return this.#turns.take(account, async () => {
      await this.#check(account, address);
      const user = await verify();
      await (user === null ? this.#failed(account, address) : this.#succeeded(account, address));
      return user;
    });
  }

  /** Before a password is looked at. */
  async #check(account: string, address: string): Promise<void> {
    const [wait, byAccount, byAddress] = await Promise.all([
      this.#wait.get(`${account}|${address}`),
      this.#account.get(account),
      this.#address.get(address),
    ]);
    if (wait && wait.consumedPoints >= 1) throw this.#refuse(seconds(wait));
    if (byAddress && byAddress.consumedPoints >= 100) throw this.#refuse(seconds(byAddress));
    if (byAccount && byAccount.consumedPoints >= 20) {
      const slow = await this.#slow.get(account);
      if (slow && slow.consumedPoints >= 1) throw this.#refuse(seconds(slow));
      await this.#slow.penalty(account, 1);
    }
  }

  async #failed(account: string, address: string): Promise<void> {
    const pair = await this.#pair.penalty(`${account}|${address}`, 1);
    await Promise.all([this.#account.penalty(account, 1), this.#address.penalty(address, 1)]);
    const step = LADDER.findLast(({ failures }) => pair.consumedPoints >= failures);
    if (step && (pair.consumedPoints % 5 === 0 || pair.consumedPoints > 15)) {
      await this.#wait.set(`${account}|${address}`, 1, step.wait);
    }
  }

  async #succeeded(account: string, address: string): Promise<void> {
    await Promise.all([this.#pair.delete(`${account}|${address}`), this.#account.delete(account)]);
  }

  #refuse(wait: number): Problem {
    const words = wait < 90 ? `${wait} seconds` : `${Math.ceil(wait / 60)} minutes`;
    return tooMany(
      wait,
      `Too many tries with a wrong password. Try again in ${words}, or ask your school for a new password.`,
    );
  }
}
