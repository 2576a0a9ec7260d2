/** A request as a curl command says it. */
export interface CommandedRequest {
  url: string;
  headers: Record<string, string>;
  body: string;
}

/** Reads the kind of command that the dashboard offers to copy: an address, headers, a body in single quotes. */
export function readCommand(command: string): CommandedRequest {
  const url = /^curl -i (\S+)/.exec(command)?.[1];
  const body = /-d '(.*)'$/s.exec(command)?.[1];
  if (url === undefined || body === undefined) throw new Error(`Not a command to post with: ${command}`);
  const headers = [...command.matchAll(/-H '([^:']+): ([^']*)'/g)].map(([, name = '', value = '']) => [
    name,
    value,
  ]);
  return { url, headers: Object.fromEntries(headers) as Record<string, string>, body };
}
