import { getNodePath, parseTree, visit, type JSONVisitor } from 'jsonc-parser';
import { type ErrorPlace, MalformedError } from '../common/errors.js';

const deepestNesting = 12;
const utf8 = new TextDecoder('utf-8', { fatal: true });

export const pointerOf = (path: readonly (string | number)[]): string =>
  path.map((part) => `/${String(part).replaceAll('~', '~0').replaceAll('/', '~1')}`).join('');

/**
 * Reads a post's bytes as strict JSON (RFC 8259) in UTF-8. What JSON.parse would let pass silently is
 * refused here: a name given twice (one of both would vanish), nesting beyond 12 levels, text with half a
 * surrogate pair (it has no UTF-8 form, so no canonical JSON).
 * @throws MalformedError with the places.
 */
export function parsePost(bytes: Buffer): unknown {
  const text = decode(bytes);
  const value = parseStrictly(text);
  const errors = hiddenFaults(text);
  if (errors.length > 0)
    throw new MalformedError(
      'The JSON can be read in more than one way or not kept as it is; see errors.',
      errors,
    );
  return value;
}

function decode(bytes: Buffer): string {
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
    if (depth > deepestNesting)
      throw new MalformedError(`The JSON nests deeper than ${deepestNesting} levels.`);
  };
  const checkText = (value: unknown, path: readonly (string | number)[]): void => {
    if (typeof value === 'string' && !isWellFormed(value)) {
      errors.push({
        pointer: pointerOf(path),
        code: 'text',
        detail: 'This text holds half a surrogate pair.',
      });
    }
  };
  const visitor: JSONVisitor = {
    onObjectBegin: () => {
      enter();
      names.push(new Set());
    },
    onObjectEnd: () => {
      depth -= 1;
      names.pop();
    },
    onArrayBegin: enter,
    onArrayEnd: () => {
      depth -= 1;
    },
    onObjectProperty: (name, _offset, _length, _line, _column, path) => {
      const place = [...path(), name];
      checkText(name, place);
      const seen = names.at(-1);
      if (seen?.has(name))
        errors.push({
          pointer: pointerOf(place),
          code: 'duplicateName',
          detail: `"${name.slice(0, 64)}" is given twice.`,
        });
      seen?.add(name);
    },
    onLiteralValue: (value, _offset, _length, _line, _column, path) =>
      checkText(value, typeof value === 'string' ? path() : []),
  };
  visit(text, visitor);
  return errors.slice(0, 50);
}

const isWellFormed = (text: string): boolean => !/\p{Surrogate}/u.test(text);
