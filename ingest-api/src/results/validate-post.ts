import type { ErrorObject } from 'ajv/dist/2020.js';
import { createAjv } from '../common/create-ajv.js';
import type { ErrorPlace } from '../common/errors.js';
import { pointerOf } from './parse-post.js';
import schema from './result.schema.json';
import type { PostedResult } from './result.types.js';

export { schema as resultSchema };

const check = createAjv({ verbose: true }).compile<PostedResult>(schema);
const mostErrors = 50;

/** Gives the places where a value breaks the result schema; none means that it is a PostedResult. */
export function findFaults(value: unknown): ErrorPlace[] {
  if (check(value)) return [];
  const faults = (check.errors ?? []).filter((error) => error.keyword !== 'if').map(toPlace);
  return faults.slice(0, mostErrors);
}

function toPlace(error: ErrorObject): ErrorPlace {
  const { keyword, instancePath, params } = error;
  const name = params as { missingProperty?: string; additionalProperty?: string; propertyName?: string };
  if (keyword === 'required') {
    return {
      pointer: instancePath + pointerOf([name.missingProperty ?? '']),
      code: 'required',
      detail: `"${name.missingProperty}" is missing.`,
    };
  }
  if (keyword === 'additionalProperties') {
    const found = name.additionalProperty ?? '';
    return {
      pointer: instancePath + pointerOf([found]),
      code: 'unknownProperty',
      detail: `"${found.slice(0, 64)}" is no property of this contract${suggestion(found, error)}. Values of your own go into "extra".`,
    };
  }
  if (keyword === 'enum') {
    const allowed = (params as { allowedValues: unknown[] }).allowedValues.join(', ');
    return { pointer: instancePath, code: 'enum', detail: `Must be one of: ${allowed}.` };
  }
  if (keyword === 'pattern') {
    return {
      pointer: instancePath,
      code: 'pattern',
      detail: 'Must hold no control characters and neither begin nor end with a space.',
    };
  }
  return { pointer: instancePath, code: keyword, detail: `This ${error.message ?? 'is not valid'}.` };
}

/** "loadVolt" → did you mean "loadVolts"? Only when it is near enough to be a slip. */
function suggestion(found: string, error: ErrorObject): string {
  const known = Object.keys((error.parentSchema as { properties?: object } | undefined)?.properties ?? {});
  const near = known.find((candidate) => isNear(found.toLowerCase(), candidate.toLowerCase()));
  return near === undefined ? '' : `; did you mean "${near}"?`;
}

function isNear(left: string, right: string): boolean {
  if (left.length > 64 || Math.abs(left.length - right.length) > 2) return false;
  let previous = Array.from({ length: right.length + 1 }, (_, index) => index);
  for (let i = 1; i <= left.length; i += 1) {
    const row = [i];
    for (let j = 1; j <= right.length; j += 1) {
      const substitution = previous[j - 1]! + (left[i - 1] === right[j - 1] ? 0 : 1);
      row.push(Math.min(previous[j]! + 1, row[j - 1]! + 1, substitution));
    }
    previous = row;
  }
  return previous[right.length]! <= 2;
}
