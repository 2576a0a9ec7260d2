export interface TextPart {
  text: string;
  /** Set where the text is an address. */
  href: string | null;
}

/** Only web addresses become links; what else a text holds stays text. */
const address = /https?:\/\/[^\s<>"]+[^\s<>".,;:!?)]/g;

/** Cuts a plain text at the addresses in it. */
export function textParts(text: string): TextPart[] {
  const parts: TextPart[] = [];
  let done = 0;
  for (const match of text.matchAll(address)) {
    if (match.index > done) parts.push({ text: text.slice(done, match.index), href: null });
    parts.push({ text: match[0], href: match[0] });
    done = match.index + match[0].length;
  }
  if (done < text.length) parts.push({ text: text.slice(done), href: null });
  return parts;
}
