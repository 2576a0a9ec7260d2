import type { RandomSource } from '../circuit/random.js';
import { nextTest } from '../plan/next-test.js';
import type { PlannedTest } from '../plan/build-plan.js';
import { countDelivery, emptyTally, type Tally } from '../report/tally.js';
import type { Clock } from '../send/clock.js';
import type { PostResult } from '../send/post-result.js';
import type { Spool, SpooledPost } from '../send/spool.js';
import { createStationLane, type StationLane } from '../send/station-lane.js';
import { createHeldPosts, type Outage } from './outage.js';
import { runTest, type DueTest } from './run-test.js';
import { createWaitingRoom } from './waiting-room.js';

export interface SimulationOptions {
  plan: Iterator<PlannedTest, void>;
  stations: number;
  testsPerSecond: number;
  /** How many tests to run; 0 goes on until stopped. */
  count: number;
  /** When the network is away; null when it never is. */
  outage: Outage | null;
}

export interface SimulationParts {
  clock: Clock;
  send: PostResult;
  spool: Spool;
  keys: Readonly<Record<string, string>>;
  random: RandomSource;
  /** Aborted: no more tests; what is on its way gets a short while. */
  stop: AbortSignal;
  onProgress: (tally: Tally) => void;
}

/** How long the posts under way may take once the last test is done. */
const DRAIN_MS = 30_000;

/** The same after somebody asked the run to stop. */
const DRAIN_STOPPED_MS = 3_000;

/** Acts the plan out: tests units, posts their results, moves the units on by the answers. */
export async function runSimulation(options: SimulationOptions, parts: SimulationParts): Promise<Tally> {
  const { clock, spool, stop, onProgress } = parts;
  const tally = emptyTally();
  const units = createWaitingRoom();
  const giveUp = new AbortController();
  const laneOf = lanes(parts, giveUp.signal);
  const underWay = new Set<Promise<void>>();

  const send = ({ station, post }: SpooledPost, moveOn: (answer: Parameters<typeof nextTest>[2]) => void) => {
    tally.waiting++;
    const sent = laneOf(station)
      .deliver(post, (reason) => {
        tally.retries++;
        tally.lastTrouble = reason;
        moveOn(null);
        onProgress(tally);
      })
      .then((delivery) => {
        countDelivery(tally, delivery);
        if (delivery.kind === 'accepted') moveOn(delivery.answer);
        onProgress(tally);
      })
      .finally(() => underWay.delete(sent));
    underWay.add(sent);
  };

  const held = createHeldPosts(options.outage, parts.random.fork('outage'));
  const sendHeld = async () => {
    for (const spooled of held.release(clock.now())) {
      await spool.add(spooled);
      tally.waiting--;
      send(spooled, () => undefined);
    }
  };

  for (const leftOver of spool.leftOver) {
    tally.replayed++;
    send(leftOver, () => undefined);
  }
  while (!stop.aborted && !tally.blocked && (options.count === 0 || tally.tested < options.count)) {
    const next = units.takeDue(clock.now()) ?? fromPlan(options.plan);
    if (next) {
      const post = runTest(next, options.stations, clock.now(), parts.random);
      const spooled = { station: next.test.station, post };
      const moveOn = units.moverOf(next, post, options.stations, clock);
      await spool.add(spooled);
      tally.tested++;
      if (held.isAway(tally.tested)) {
        tally.waiting++;
        held.hold(spooled);
        moveOn(null);
        onProgress(tally);
      } else {
        await sendHeld();
        send(spooled, moveOn);
      }
    } else if (units.isEmpty() && underWay.size === 0) break;
    await clock.wait(1000 / options.testsPerSecond, stop);
  }
  if (!stop.aborted && !tally.blocked) await sendHeld();
  await settle(underWay, tally, parts, giveUp);
  return tally;
}

function fromPlan(plan: Iterator<PlannedTest, void>): DueTest | null {
  const next = plan.next();
  return next.done ? null : { test: next.value, trial: 1, routedOn: 'hub' };
}

/** Gives the posts under way their while; what is not settled then stays in the spool. */
async function settle(
  underWay: ReadonlySet<Promise<void>>,
  tally: Tally,
  { clock, stop }: SimulationParts,
  giveUp: AbortController,
): Promise<void> {
  const settled = new AbortController();
  const hurry = new AbortController();
  const all = Promise.all(underWay).finally(() => {
    settled.abort();
    hurry.abort();
  });
  const onStop = () => hurry.abort();
  stop.addEventListener('abort', onStop, { once: true });
  if (!stop.aborted && !tally.blocked) await clock.wait(DRAIN_MS, hurry.signal);
  if (stop.aborted || tally.blocked) await clock.wait(DRAIN_STOPPED_MS, settled.signal);
  stop.removeEventListener('abort', onStop);
  giveUp.abort();
  await all;
}

function lanes(parts: SimulationParts, giveUp: AbortSignal): (station: string) => StationLane {
  const known = new Map<string, StationLane>();
  return (station) => {
    const lane =
      known.get(station) ??
      createStationLane({
        apiKey: parts.keys[station] ?? '',
        send: parts.send,
        spool: parts.spool,
        clock: parts.clock,
        random: parts.random.fork(`retries of ${station}`),
        giveUp,
      });
    known.set(station, lane);
    return lane;
  };
}
