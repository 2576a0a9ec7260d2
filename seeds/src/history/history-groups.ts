import { buildHistory, type HistoryOptions } from './build-history.js';
import { judgePost } from './judge-post.js';

/** A post as the hub gets it. */
export interface Delivery {
  station: string;
  /** Epoch milliseconds. */
  receivedAt: number;
  /** JSON. */
  body: string;
}

/** Posts that are handed in together: as many as the server's writer commits as one group. */
export type DeliveryGroup = readonly Delivery[];

const GROUP_SIZE = 200;

/** A history in groups, in the order of arrival. */
export function* historyGroups(options: HistoryOptions): Generator<DeliveryGroup, void> {
  let group: Delivery[] = [];
  for (const { station, receivedAt, post } of buildHistory(options, judgePost)) {
    const size = group.push({ station, receivedAt: receivedAt.getTime(), body: JSON.stringify(post) });
    if (size < GROUP_SIZE) continue;
    yield group;
    group = [];
  }
  if (group.length > 0) yield group;
}
