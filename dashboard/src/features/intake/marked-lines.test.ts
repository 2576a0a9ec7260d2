import { describe, expect, it } from 'vitest';
import { markLines } from './marked-lines';

const text = 'ab\ncdef\ng';

describe('markLines', () => {
  it('cuts a line at a place and keeps every sign', () => {
    const lines = markLines(text, [{ reason: 2, offset: 4, length: 2 }]);
    expect(lines[1]).toEqual({
      segments: [
        { text: 'c', reason: null },
        { text: 'de', reason: 2 },
        { text: 'f', reason: null },
      ],
      reasons: [2],
    });
    expect(lines.map(({ segments }) => segments.map((segment) => segment.text).join('')).join('\n')).toBe(
      text,
    );
  });

  it('carries a mark over the end of a line but tells its reason once', () => {
    const lines = markLines(text, [{ reason: 0, offset: 1, length: 4 }]);
    expect(lines.map(({ reasons }) => reasons)).toEqual([[0], [], []]);
    expect(lines[1]?.segments[0]).toEqual({ text: 'cd', reason: 0 });
  });

  it('keeps the first of two marks that overlap, and both reasons', () => {
    const [line] = markLines('abcd', [
      { reason: 0, offset: 0, length: 3 },
      { reason: 1, offset: 1, length: 1 },
    ]);
    expect(line?.reasons).toEqual([0, 1]);
    expect(line?.segments).toEqual([
      { text: 'abc', reason: 0 },
      { text: 'd', reason: null },
    ]);
  });

  it('tells the reason of a text that broke off at its end', () => {
    const lines = markLines('{"a":', [{ reason: 0, offset: 5, length: 1 }]);
    expect(lines.map(({ reasons }) => reasons)).toEqual([[0]]);
  });
});
