import type { ErrorObject } from 'ajv/dist/2020.js';
import { createAjv } from '../common/create-ajv.js';
import type { ErrorPlace } from '../common/errors.js';
import { pointerOf, shortened } from './parse-post.js';
import schema from './result.schema.json';
import type { PostedResult } from './result.types.js';

export { schema as resultSchema };

const check = createAjv({ verbose: true }).compile<PostedResult>(schema);
/** For what is far too large to be a result: the first fault will do, all of them would take seconds. */
const checkFirst = createAjv({ verbose: true, allErrors: false }).compile<PostedResult>(schema);
const MOST_ERRORS = 50;
/** 500 points with every property come to 5,000. */
const MOST_VALUES = 10_000;

/** Gives the places where a value breaks the result schema; none means that it is a PostedResult. */
export function findFaults(value: unknown): ErrorPlace[] {
  const validate = countValues(value) > MOST_VALUES ? checkFirst : check;
  if (validate(value)) return [];
  const faults = (validate.errors ?? []).filter(isWorthTelling);
  return faults.slice(0, MOST_ERRORS).map(toPlace);
}

/** `if` and what is wrong with a name say the same as the error that goes with them, in worse words. */
const isWorthTelling = ({ keyword, propertyName }: ErrorObject): boolean =>
  keyword !== 'if' && propertyName === undefined;

function countValues(value: unknown): number {
  if (value === null || typeof value !== 'object') return 1;
  return Object.values(value).reduce<number>((sum, inner) => sum + countValues(inner), 1);
}

function toPlace(error: ErrorObject): ErrorPlace {
  const { keyword, params } = error;
  const name = params as { missingProperty?: string; additionalProperty?: string; propertyName?: string };
  const instancePath = error.instancePath.split('/').map(shortened).join('/');
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
      detail: `"${shortened(found)}" is no property of this contract${suggestion(found, error)} Values of your own go into "extra".`,
    };
  }
  if (keyword === 'enum') {
    const allowed = (params as { allowedValues: unknown[] }).allowedValues.join(', ');
    return { pointer: instancePath, code: 'enum', detail: `Must be one of: ${allowed}.` };
  }
  if (keyword === 'propertyNames') {
    const found = name.propertyName ?? '';
    return {
      pointer: instancePath + pointerOf([found]),
      code: 'propertyNames',
      detail: `"${shortened(found)}" can't be a name: ${NAMES_ARE}`,
    };
  }
  if (keyword === 'format' || keyword === 'pattern') {
    return { pointer: instancePath, code: keyword, detail: formDetail(error) };
  }
  return { pointer: instancePath, code: keyword, detail: `This ${error.message ?? 'is not valid'}.` };
}

const NAMES_ARE = 'up to 64 characters, no control characters, no space at either end, not "." or "..".';

/** What a text has to look like, in words; regular expressions are nobody's help. */
function formDetail({ schemaPath, params }: ErrorObject): string {
  const { format } = params as { format?: string };
  if (format === 'date-time') return 'Must be an RFC 3339 time with zone, such as 2026-11-30T08:15:30.120Z.';
  if (format === 'uuid' || schemaPath.includes('/resultId/'))
    return 'Must be a UUID, such as 0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11.';
  return `Must be a name: ${NAMES_ARE}`;
}

/** Ends the sentence, for "loadVolt" with `did you mean "loadVolts"?`; only when it is near enough to be a slip. */
function suggestion(found: string, error: ErrorObject): string {
  const known = Object.keys((error.parentSchema as { properties?: object } | undefined)?.properties ?? {});
  const near = known.find((candidate) => isNear(found.toLowerCase(), candidate.toLowerCase()));
  return near === undefined ? '.' : `; did you mean "${near}"?`;
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
