import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { answer, refuse } from '@/testing/handlers';
import { aLimitSet, aProduct, aTestPlan } from '@/testing/product-builders';
import { renderRoute } from '@/testing/render-route';

const plain = (element: HTMLElement) => element.textContent?.replace(/\u202f/g, ' ');
const stage = (overrides = {}) => ({
  stage: 'final',
  position: 1,
  maxAttempts: 3,
  yieldTarget: 0.98,
  testPlan: aTestPlan(),
  limitSet: aLimitSet(),
  ...overrides,
});

describe('Limits', () => {
  it('shows what is in force at a stage, since when and by whom', async () => {
    renderRoute('/limits', [answer('GET', '/products', [aProduct({ stages: [stage()] })])]);
    const part = await screen.findByRole('region', { name: 'FH-R500-W final' });
    expect(plain(part)).toMatch(
      /Limits 2, in force since 1 Nov 2026, released by Ines Calder on 30 Oct 2026/,
    );
    expect(within(part).getByRole('img', { name: /3 load steps from 0.*8.*up/ })).toBeInTheDocument();
    expect(plain(within(part).getByRole('cell', { name: /^at least/ }))).toBe('at least 10 MΩ');
  });

  it('says in words what a rule risks', async () => {
    const limitSet = aLimitSet();
    limitSet.limits.push({
      measure: 'setpointError',
      lower: -1,
      upper: 1,
      rule: 'simple',
      guardFactor: 1,
      guardedRisk: 0.02275,
    });
    renderRoute('/limits', [answer('GET', '/products', [aProduct({ stages: [stage({ limitSet })] })])]);
    expect(plain(await screen.findByText(/^It passes when/))).toMatch(/risk of at most 2\.3 %/);
    expect(screen.getByText(/^Decided at the limit itself/)).toHaveTextContent('up to 50 %');
  });

  it('says when nothing is released', async () => {
    renderRoute('/limits', [
      answer('GET', '/products', [aProduct({ stages: [stage({ testPlan: null, limitSet: null })] })]),
    ]);
    expect(await screen.findByText(/No limits are released/)).toBeInTheDocument();
    expect(screen.getByText('No test plan is in force.')).toBeInTheDocument();
  });

  it('says that no product is there, or why they could not be had', async () => {
    const { unmount } = renderRoute('/limits', [answer('GET', '/products', [])]);
    expect(await screen.findByText('No product is set up yet.')).toBeInTheDocument();
    unmount();
    renderRoute('/limits', [refuse('GET', '/products', { status: 503, detail: 'Being set up.' })]);
    expect(await screen.findByRole('alert')).toHaveTextContent('Being set up.');
  });
});
