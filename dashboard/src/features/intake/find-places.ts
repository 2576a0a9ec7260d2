import { parseTree, type Node, type ParseError } from 'jsonc-parser';
import type { ProblemError } from '@/types/api';

/** Where in a posted text one of its faults stands. */
export interface Place {
  /** Place of the fault in the list of reasons. */
  reason: number;
  offset: number;
  length: number;
}

const strictJson = { disallowComments: true, allowTrailingComma: false };

/** Faults that are about a name, not about what it stands for. */
const codesOfNames = new Set(['unknownProperty', 'duplicateName', 'propertyNames']);

/**
 * Finds the faults' JSON Pointers (RFC 6901) in the text as it came in, however broken it is. A name that is missing
 * is placed at the object that lacks it; a fault of the text itself at the sign that could not be read.
 */
export function findPlaces(text: string, errors: readonly ProblemError[]): Place[] {
  const faults: ParseError[] = [];
  const root = parseTree(text, faults, strictJson);
  return errors.flatMap((error, reason) => {
    const fault = faults[0];
    if (error.code === 'json' && fault) {
      return [{ reason, offset: fault.offset, length: Math.max(1, fault.length) }];
    }
    return root ? placesOf(root, error).map(({ offset, length }) => ({ reason, offset, length })) : [];
  });
}

function placesOf(root: Node, { pointer, code }: ProblemError): Pick<Node, 'offset' | 'length'>[] {
  const tokens = readPointer(pointer);
  let reached: Node[] = [root];
  let isWhole = true;
  for (const token of tokens) {
    const next = reached.flatMap((node) => childrenAt(node, token));
    isWhole = next.length > 0;
    if (!isWhole) break;
    reached = next;
  }
  return reached.map((node) => spot(node, isWhole && codesOfNames.has(code)));
}

const readPointer = (pointer: string): string[] =>
  pointer
    .split('/')
    .slice(1)
    .map((token) => token.replaceAll('~1', '/').replaceAll('~0', '~'));

/** All of them: the text may give a name twice. */
function childrenAt(node: Node, token: string): Node[] {
  const children = node.children ?? [];
  if (node.type === 'array')
    return /^\d+$/.test(token) ? children.slice(Number(token), Number(token) + 1) : [];
  return children.flatMap(({ children: pair = [] }) => {
    const [name, value] = pair;
    return name?.value === token ? [value ?? name] : [];
  });
}

/** A value as a whole; of an object or array its name, so that half a post isn't marked. */
function spot(node: Node, isAboutName: boolean): Pick<Node, 'offset' | 'length'> {
  const name = node.parent?.type === 'property' ? node.parent.children?.[0] : undefined;
  const isLong = node.type === 'object' || node.type === 'array';
  if (name && (isAboutName || isLong)) return name;
  return isLong ? { offset: node.offset, length: 1 } : node;
}
