import { describe, expect, it } from 'vitest';
import { textParts } from './text-parts';

describe('textParts', () => {
  it('finds addresses and leaves the full stop behind them alone', () => {
    expect(textParts('See http://localhost:4780/breaches/1. Done')).toEqual([
      { text: 'See ', href: null },
      { text: 'http://localhost:4780/breaches/1', href: 'http://localhost:4780/breaches/1' },
      { text: '. Done', href: null },
    ]);
  });

  it('makes no link of anything but a web address', () => {
    expect(textParts('javascript:alert(1) mailto:a@b.example')).toEqual([
      { text: 'javascript:alert(1) mailto:a@b.example', href: null },
    ]);
  });

  it('keeps every sign of the text', () => {
    const text = 'a http://x.example/b?c=d#e\n(https://y.example/z)\n';
    expect(
      textParts(text)
        .map((part) => part.text)
        .join(''),
    ).toBe(text);
  });
});
