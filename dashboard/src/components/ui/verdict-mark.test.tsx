import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import type { Verdict } from '@/types/api';
import { verdictNames } from '@/utils/verdict-names';
import { VerdictMark } from './verdict-mark';

const verdicts = Object.keys(verdictNames) as Verdict[];

describe('VerdictMark', () => {
  it.each(verdicts)('tells %s by a word, also where the word is not shown', (verdict) => {
    render(<VerdictMark verdict={verdict} isWordHidden />);
    expect(screen.getByText(verdictNames[verdict])).toBeInTheDocument();
  });

  it('has another shape for each verdict', () => {
    const shapes = verdicts.map(
      (verdict) => render(<VerdictMark verdict={verdict} />).container.querySelector('svg')?.innerHTML,
    );
    expect(new Set(shapes).size).toBe(verdicts.length);
  });
});
