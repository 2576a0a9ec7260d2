/** HTML that is safe to send: everything put into it was escaped. */
export class Html {
  constructor(readonly source: string) {}
}

const entities: Record<string, string> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

const escape = (text: string): string => text.replace(/[&<>"']/g, (character) => entities[character]!);

type Part = string | number | Html | readonly Html[];

/** Template tag: what is put in is escaped unless it is Html itself, so station text can't become markup. */
export function html(strings: TemplateStringsArray, ...parts: readonly Part[]): Html {
  const source = strings.map((text, index) => (index === 0 ? text : sourceOf(parts[index - 1]!) + text));
  return new Html(source.join(''));
}

function sourceOf(part: Part): string {
  if (part instanceof Html) return part.source;
  if (typeof part === 'object') return part.map(({ source }) => source).join('');
  return escape(String(part));
}
