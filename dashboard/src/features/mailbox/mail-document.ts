/** Links of a mail open in this tab: its frame is no place for a page of the dashboard. */
const base = '<base target="_top">';

/** A mail's HTML as the document of its sandboxed frame. */
export function mailDocument(html: string): string {
  const head = /<head(?:\s[^>]*)?>/i.exec(html);
  if (!head) return base + html;
  const place = head.index + head[0].length;
  return html.slice(0, place) + base + html.slice(place);
}
