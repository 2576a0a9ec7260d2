import { render, screen } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aSlope } from '@/testing/builders';
import { SlopeMark } from './slope-mark';

const nameOf = () =>
  screen
    .getByRole('img')
    .getAttribute('aria-label')
    ?.replace(/\u202f/g, ' ');

describe('SlopeMark', () => {
  it('says in words what it shows', () => {
    render(<SlopeMark slope={aSlope()} />);
    expect(nameOf()).toBe('Output impedance 12.14 MΩ, limit 10 MΩ');
  });

  it('says a bound as at least', () => {
    render(
      <SlopeMark slope={aSlope({ impedanceOhms: 0.9e6, impedanceBound: 'atLeast', limitSiemens: 1e-6 })} />,
    );
    expect(nameOf()).toBe('Output impedance at least 900 kΩ, limit 1 MΩ');
  });

  it('says that the current rises instead of inventing an impedance', () => {
    render(<SlopeMark slope={aSlope({ conductanceSiemens: -5e-8, impedanceOhms: null })} />);
    expect(nameOf()).toMatch(/the current rises/);
  });

  it('says that there is no limit', () => {
    render(<SlopeMark slope={aSlope({ limitSiemens: null })} />);
    expect(nameOf()).toMatch(/no limit to draw it against/);
  });

  it('stays silent beside text that says the same', () => {
    render(<SlopeMark slope={aSlope()} isDecorative />);
    expect(screen.queryByRole('img')).not.toBeInTheDocument();
  });

  it('draws at every size from 24 to 120 px', () => {
    for (const size of [24, 120]) {
      const { container, unmount } = render(<SlopeMark slope={aSlope()} size={size} />);
      expect(container.querySelector('svg')).toHaveAttribute('width', String(size));
      unmount();
    }
  });
});
