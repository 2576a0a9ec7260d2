import type { PostedResult } from '@/types/api';

/** Stands in the command until a key was given. */
const KEY_PLACEHOLDER = 'amk_YOUR_KEY';

/** JSON that people can read: one property a line, one point a line. */
export function readableJson(post: PostedResult): string {
  const properties = Object.entries(post).map(
    ([name, value]) => `  ${JSON.stringify(name)}: ${inLine(value)}`,
  );
  return `{\n${properties.join(',\n')}\n}`;
}

function inLine(value: unknown): string {
  if (!Array.isArray(value)) return JSON.stringify(value);
  return `[\n${value.map((item) => `    ${JSON.stringify(item)}`).join(',\n')}\n  ]`;
}

/** The whole command for a POSIX shell; the body needs no escape but for single quotes. */
export function curlCommand(origin: string, key: string, post: PostedResult): string {
  return [
    `curl -i ${origin}/api/v1/results \\`,
    `  -H 'X-API-Key: ${quoted(key || KEY_PLACEHOLDER)}' \\`,
    `  -H 'Content-Type: application/json' \\`,
    `  -d '${quoted(readableJson(post))}'`,
  ].join('\n');
}

const quoted = (text: string): string => text.replaceAll("'", String.raw`'\''`);
