import type { Place } from './find-places';

export interface Segment {
  text: string;
  /** Which reason marks it; null for plain text. */
  reason: number | null;
}

export interface MarkedLine {
  segments: Segment[];
  /** Reasons whose place begins in this line. */
  reasons: number[];
}

/** Cuts a text into lines and its lines at the places. Of places that overlap the first keeps the mark. */
export function markLines(text: string, places: readonly Place[]): MarkedLine[] {
  const sorted = [...places].sort((a, b) => a.offset - b.offset || a.length - b.length);
  let start = 0;
  return text.split('\n').map((line) => {
    const end = start + line.length;
    // The line's end belongs to it: a text that broke off has its fault there.
    const here = sorted.filter(({ offset }) => offset >= start && offset <= end);
    const marked = {
      segments: cut(line, start, sorted),
      reasons: [...new Set(here.map(({ reason }) => reason))],
    };
    start = end + 1;
    return marked;
  });
}

function cut(line: string, start: number, places: readonly Place[]): Segment[] {
  const segments: Segment[] = [];
  let done = 0;
  for (const { offset, length, reason } of places) {
    const from = Math.max(offset - start, 0);
    const to = Math.min(offset + length - start, line.length);
    if (from >= to || from < done) continue;
    if (from > done) segments.push({ text: line.slice(done, from), reason: null });
    segments.push({ text: line.slice(from, to), reason });
    done = to;
  }
  if (done < line.length || segments.length === 0) segments.push({ text: line.slice(done), reason: null });
  return segments;
}
