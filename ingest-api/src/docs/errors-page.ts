import { errorCatalogue } from './error-catalogue.js';

const escape = (text: string): string => text.replaceAll('&', '&amp;').replaceAll('<', '&lt;');

/** The error catalogue as a page; a problem's `type` points to its row. */
export function errorsPage(): string {
  const rows = errorCatalogue.map(
    ({ code, status, meaning, remedy }) =>
      `<tr id="${code}"><th scope="row"><code>${code}</code></th><td>${status}</td><td>${escape(meaning)}</td><td>${escape(remedy)}</td></tr>`,
  );
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>Errors · Ampkeep</title><style>
:root{color-scheme:light dark}body{font:16px/1.5 system-ui,sans-serif;max-width:60rem;margin:2rem auto;padding:0 1rem}
table{border-collapse:collapse}th,td{text-align:left;vertical-align:top;padding:.4rem .8rem;border-bottom:1px solid #8888}
tr:target{outline:2px solid #a84b12}</style></head><body><main><h1>Errors</h1>
<p>Every error is a problem document (RFC 9457). Write your program against <code>code</code>; <code>errors</code> names each
place by its JSON Pointer.</p><table><thead><tr><th>code</th><th>status</th><th>what it means</th><th>what to do</th></tr></thead>
<tbody>${rows.join('')}</tbody></table><p><a href="/docs">API docs</a></p></main></body></html>`;
}
