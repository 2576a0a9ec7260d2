import { type ErrorPlace, InvalidError } from '../common/errors.js';
import { type CatalogueProduct, findStage } from '../products/catalogue.js';
import type { PostedResult } from './result.types.js';
import { findFaults } from './validate-post.js';

/** How far ahead of the server a station's clock may be. */
const ALLOWED_LEAD_MS = 5 * 60_000;

interface PostSurroundings {
  /** The server's time, epoch ms. */
  now: number;
  findProduct: (partNumber: string) => CatalogueProduct | undefined;
}

/**
 * Checks content against the schema, the calendar and the catalogue.
 * @throws InvalidError with every place that needs mending.
 */
export function checkPost(content: unknown, { now, findProduct }: PostSurroundings): PostedResult {
  const faults = findFaults(content);
  if (faults.length > 0) throw new InvalidError(faults);
  const post = content as PostedResult;
  const places = [...timeFaults(post, now), ...nameFaults(post, findProduct(post.partNumber))];
  if (places.length > 0) throw new InvalidError(places);
  return post;
}

function timeFaults(post: PostedResult, now: number): ErrorPlace[] {
  const faults: ErrorPlace[] = [];
  for (const name of ['startedAt', 'finishedAt', 'sentAt'] as const) {
    const text = post[name];
    if (text !== undefined && Number.isNaN(Date.parse(text))) {
      const detail = 'Is no time that exists (a leap second perhaps); give an RFC 3339 time.';
      faults.push({ pointer: `/${name}`, code: 'time', detail });
    }
  }
  if (Date.parse(post.startedAt) > now + ALLOWED_LEAD_MS) {
    const serverTime = new Date(now).toISOString();
    const detail = `Lies more than 5 minutes ahead of the server, whose time is ${serverTime}. Set the station's clock.`;
    faults.push({ pointer: '/startedAt', code: 'inFuture', detail });
  }
  return faults;
}

function nameFaults(
  { partNumber, stage }: PostedResult,
  product: CatalogueProduct | undefined,
): ErrorPlace[] {
  if (product === undefined) {
    const detail = `"${partNumber}" is no product here. Mend the name, or have the product created.`;
    return [{ pointer: '/partNumber', code: 'unknownPartNumber', detail }];
  }
  if (findStage(product, stage) !== undefined) return [];
  const stages = product.stages.map(({ name }) => name).join(', ') || 'none yet';
  const detail = `"${stage}" is no stage of ${partNumber}; its stages are: ${stages}.`;
  return [{ pointer: '/stage', code: 'unknownStage', detail }];
}
