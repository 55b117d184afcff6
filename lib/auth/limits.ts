import 'server-only';
import { RateLimiterPostgres, RateLimiterRes } from 'rate-limiter-flexible';
import { serverPool } from '@/db/client';
import { tooMany } from '@/lib/errors';

const limiter = (keyPrefix: string, points: number, duration: number) =>
  new RateLimiterPostgres({
    storeClient: serverPool(),
    tableName: 'rate_limits',
    tableCreated: true,
    clearExpiredByTimeout: false,
    keyPrefix,
    points,
    duration,
  });

const makeLimiters = () => ({
  // One guesser against many accounts, and many guessers against one account.
  byAddress: limiter('sign_in_ip', 50, 15 * 60),
  byAccount: limiter('sign_in_account', 8, 15 * 60),
});

let kept: ReturnType<typeof makeLimiters> | undefined;
const limiters = () => {
  kept ??= makeLimiters();
  return kept;
};

/** Counts a try to sign in; throws 429 with the seconds to wait when there were too many. */
export const countSignInTry = async (email: string, address: string): Promise<void> => {
  try {
    await limiters().byAddress.consume(address);
    await limiters().byAccount.consume(email.toLowerCase());
  } catch (refusal) {
    if (refusal instanceof RateLimiterRes) throw tooMany(Math.ceil(refusal.msBeforeNext / 1000));
    throw refusal;
  }
};

/** A right password clears the account's counter and takes its own try off the address, which an office shares. */
export const forgetSignInTries = async (email: string, address: string): Promise<void> => {
  await limiters().byAccount.delete(email.toLowerCase());
  await limiters().byAddress.reward(address);
};
