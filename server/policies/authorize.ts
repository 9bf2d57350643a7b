import { forbidden, notFound } from '#server/errors.ts';
import type { Actor } from './actor.ts';

/** One rule: may this person do it, given facts the service has already loaded? Never queries. */
export type Rule<Facts> = (actor: Actor, facts: Facts) => boolean;
/** The rules of one noun, by action. `read` decides whether a refusal is 403 or 404. */
export type Policy<Action extends string, Facts> = Record<Action, Rule<Facts>>;

/**
 * Lets an action pass or refuses it. What a person may not read looks like what does not exist.
 * @throws Problem 404 where `read` fails, 403 where the thing may be read but this not be done
 */
export function authorize<Facts, Action extends string>(
  policy: Policy<Action, Facts> & { read?: Rule<Facts> },
  action: Action,
  actor: Actor,
  facts: Facts,
): void {
  if (policy[action](actor, facts)) return;
  if (policy.read && !policy.read(actor, facts)) throw notFound();
  throw forbidden();
}
