import { errorCatalogue } from './error-catalogue.js';

const escape = (text: string): string => text.replaceAll('&', '&amp;').replaceAll('<', '&lt;');

/** The catalogue's sentences, in which names of properties stand between backticks. */
const sentence = (text: string): string => escape(text).replaceAll(/`([^`]+)`/g, '<code>$1</code>');

/** The dashboard's colours by day and by night; the page stands alone and loads nothing. */
const styles = `
:root{color-scheme:light dark;--sheet:#FCFDF8;--ink:#1E2A2F;--faded:#566369;--rule:#D3D6CB;--copper:#A84B12}
@media(prefers-color-scheme:dark){:root{--sheet:#1A2226;--ink:#E9E4D8;--faded:#A3ADB0;--rule:#2E393E;--copper:#E08A4C}}
body{margin:0;padding:2rem 1rem;background:var(--sheet);color:var(--ink);font:16px/1.5 system-ui,sans-serif}
main{max-width:60rem;margin:auto}a{color:var(--copper)}
a:focus-visible,.scroll:focus-visible{outline:2px solid var(--copper);outline-offset:2px}
.scroll{overflow-x:auto}table{border-collapse:collapse}
th,td{padding:.4rem 1.2rem .4rem 0;border-bottom:1px solid var(--rule);text-align:left;vertical-align:top}
thead th{border-bottom-color:var(--ink);font-weight:normal;color:var(--faded)}
tr:target{outline:2px solid var(--copper)}`;

/** The error catalogue as a page; a problem's `type` points to its row. */
export function errorsPage(): string {
  const rows = errorCatalogue.map(
    ({ code, status, meaning, remedy }) =>
      `<tr id="${code}"><th scope="row"><code>${code}</code></th><td>${status}</td><td>${sentence(meaning)}</td><td>${sentence(remedy)}</td></tr>`,
  );
  return `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width">
<title>Errors · Ampkeep</title><style>${styles}</style></head><body><main><h1>Errors</h1>
<p>Every error is a problem document (RFC 9457). Write your program against <code>code</code>; <code>errors</code> names each
place by its JSON Pointer.</p><div class="scroll" role="region" aria-label="Error catalogue" tabindex="0"><table><thead>
<tr><th scope="col">code</th><th scope="col">status</th><th scope="col">what it means</th><th scope="col">what to do</th></tr>
</thead><tbody>${rows.join('')}</tbody></table></div><p><a href="/docs">API docs</a></p></main></body></html>`;
}
