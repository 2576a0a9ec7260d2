import type { RandomSource } from '../circuit/random.js';
import type { Scenario } from '../plan/scenarios.js';
import type { SpooledPost } from '../send/spool.js';

/** The tests, by running number from 1, during which nothing gets through to the hub. */
export interface Outage {
  fromTest: number;
  untilTest: number;
}

/** How many tests an endless run takes for the tests of a run that ends. */
const TESTS_OF_ENDLESS = 100;

/** The outage of a scenario in a run of so many tests (0: endless): from a fifth of them to three fifths. */
export function outageOf(scenario: Scenario, count: number): Outage | null {
  if (scenario !== 'outage') return null;
  const tests = count || TESTS_OF_ENDLESS;
  return { fromTest: Math.floor(tests / 5) + 1, untilTest: Math.floor((3 * tests) / 5) };
}

/** Posts that wait at their stations while the network is away. */
export interface HeldPosts {
  isAway(testNumber: number): boolean;
  hold(spooled: SpooledPost): void;
  /** Everything held, in any order, stamped with the time at which it goes out at last. */
  release(now: Date): SpooledPost[];
}

export function createHeldPosts(outage: Outage | null, random: RandomSource): HeldPosts {
  let held: SpooledPost[] = [];
  return {
    isAway: (testNumber) =>
      outage !== null && testNumber >= outage.fromTest && testNumber <= outage.untilTest,
    hold: (spooled) => void held.push(spooled),
    release(now) {
      const inAnyOrder = shuffle(held, random);
      held = [];
      const sentAt = now.toISOString();
      return inAnyOrder.map(({ station, post }) => ({ station, post: { ...post, sentAt } }));
    },
  };
}

/** Fisher–Yates shuffle (textbook algorithm, from memory). */
function shuffle<Item>(items: readonly Item[], random: RandomSource): Item[] {
  const shuffled = [...items];
  for (let last = shuffled.length - 1; last > 0; last--) {
    const other = random.integer(0, last);
    [shuffled[last], shuffled[other]] = [shuffled[other] as Item, shuffled[last] as Item];
  }
  return shuffled;
}
