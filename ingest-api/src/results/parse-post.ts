import { getNodePath, parseTree, visit, type JSONVisitor } from 'jsonc-parser';
import { type ErrorPlace, MalformedError } from '../common/errors.js';

const DEEPEST_NESTING = 12;
const MOST_ERRORS = 50;
const LONGEST_NAME = 64;
const utf8 = new TextDecoder('utf-8', { fatal: true });

/** No name of the contract is longer; a stranger's megabyte shall not come back in every error. */
export const shortened = (name: string): string =>
  name.length <= LONGEST_NAME ? name : `${name.slice(0, LONGEST_NAME)}…`;

export const pointerOf = (path: readonly (string | number)[]): string =>
  path.map((part) => `/${shortened(String(part)).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');

/**
 * Reads a post's bytes as strict JSON (RFC 8259) in UTF-8. What JSON.parse would let pass silently is
 * refused here: a name given twice (one of both would vanish), nesting beyond 12 levels, text with half a
 * surrogate pair (it has no UTF-8 form, so no canonical JSON).
 * @throws MalformedError with the places.
 */
export function parsePost(bytes: Buffer): unknown {
  const text = decodeUtf8(bytes);
  const value = parseStrictly(text);
  const errors = hiddenFaults(text);
  if (errors.length > 0)
    throw new MalformedError(
      'The JSON can be read in more than one way or not kept as it is; see errors.',
      errors,
    );
  return value;
}

/** Without the byte order mark that some programs begin with. */
export function decodeUtf8(bytes: Buffer): string {
  try {
    return utf8.decode(bytes);
  } catch {
    throw new MalformedError('The body is not UTF-8 text. Send JSON encoded as UTF-8.');
  }
}

function parseStrictly(text: string): unknown {
  try {
    return JSON.parse(text) as unknown;
  } catch (error) {
    const reason = error instanceof Error ? error.message : 'unreadable';
    throw new MalformedError(`The body is not JSON: ${reason.slice(0, 200)}`, [
      { pointer: placeOfFault(text), code: 'json', detail: reason.slice(0, 200) },
    ]);
  }
}

/** Where reading broke off: the innermost place that could still be read. */
function placeOfFault(text: string): string {
  try {
    const faults: { error: number; offset: number; length: number }[] = [];
    const root = parseTree(text.slice(0, 100_000), faults);
    const offset = faults[0]?.offset;
    if (root === undefined || offset === undefined) return '';
    let node = root;
    for (;;) {
      const inner = node.children?.findLast((child) => child.offset <= offset);
      if (inner === undefined) return pointerOf(getNodePath(node));
      node = inner;
    }
  } catch {
    return ''; // Nested too deeply even to look.
  }
}

function hiddenFaults(text: string): ErrorPlace[] {
  const errors: ErrorPlace[] = [];
  const names: Set<string>[] = [];
  let depth = 0;
  const enter = (): void => {
    depth += 1;
    if (depth > DEEPEST_NESTING)
      throw new MalformedError(`The JSON nests deeper than ${DEEPEST_NESTING} levels.`);
  };
  const leave = (): void => {
    depth -= 1;
  };
  const report = (path: readonly (string | number)[], code: string, detail: string): void => {
    if (errors.length < MOST_ERRORS) errors.push({ pointer: pointerOf(path), code, detail });
  };
  const halfPair = 'This text holds half a surrogate pair.';
  const visitor: JSONVisitor = {
    onObjectBegin: () => {
      enter();
      names.push(new Set());
    },
    onObjectEnd: () => {
      leave();
      names.pop();
    },
    onArrayBegin: enter,
    onArrayEnd: leave,
    onObjectProperty: (name, _offset, _length, _line, _column, path) => {
      if (!isWellFormed(name)) report([...path(), name], 'text', halfPair);
      const seen = names.at(-1)!;
      if (seen.has(name)) report([...path(), name], 'duplicateName', `"${shortened(name)}" is given twice.`);
      seen.add(name);
    },
    onLiteralValue: (value, _offset, _length, _line, _column, path) => {
      if (typeof value === 'string' && !isWellFormed(value)) report(path(), 'text', halfPair);
    },
  };
  visit(text, visitor);
  return errors;
}

const isWellFormed = (text: string): boolean => !/\p{Surrogate}/u.test(text);
