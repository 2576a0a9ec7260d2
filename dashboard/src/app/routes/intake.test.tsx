import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aStation } from '@/testing/builders';
import { answer, refuse } from '@/testing/handlers';
import { anAcceptedPost, aRefusedPost } from '@/testing/intake-builders';
import { renderRoute } from '@/testing/render-route';

const posts = answer('GET', '/intake', (_request: Request, url: URL) => {
  const kind = url.searchParams.get('kind');
  const items = [anAcceptedPost(), aRefusedPost({ count: 3 })].filter(
    (item) => kind === 'all' || item.kind === kind,
  );
  return { items, nextCursor: null };
});

describe('the Intake page', () => {
  it('lists accepted posts with their verdict and refused ones with their reason', async () => {
    renderRoute('/intake', [posts]);
    const accepted = await screen.findByRole('row', { name: /W26480417/ });
    expect(within(accepted).getByText('Pass')).toBeVisible();
    expect(within(accepted).getByRole('link')).toHaveAttribute(
      'href',
      '/units/FH-R500-W/W26480417?result=0193f3a2-6f0e-7c52-9a3e-5b1f4c0d2e11',
    );
    const refused = screen.getByRole('row', { name: /W26480418/ });
    expect(within(refused).getByText('422 against the contract')).toBeVisible();
    expect(within(refused).getByText(/Must be one of/)).toBeVisible();
    expect(within(refused).getByText(/3 times/)).toBeVisible();
    expect(within(refused).getByRole('link')).toHaveAttribute('href', '/intake/refused/x1');
  });

  it('keeps kind and station in the address', async () => {
    const { user, router } = renderRoute('/intake?kind=refused', [
      posts,
      answer('GET', '/stations', [aStation()]),
    ]);
    expect(await screen.findByText('W26480418')).toBeVisible();
    expect(screen.queryByText('W26480417')).toBeNull();
    await user.selectOptions(screen.getByLabelText('Station'), 'north-1');
    expect(router.state.location.search).toBe('?kind=refused&station=north-1');
    expect(screen.getByRole('link', { name: 'Accepted' })).toHaveAttribute(
      'href',
      '/intake?kind=accepted&station=north-1',
    );
  });

  it('leads to the first post when nothing has come in', async () => {
    renderRoute('/intake', [answer('GET', '/intake', { items: [], nextCursor: null })]);
    expect(await screen.findByText('No post has come in yet.')).toBeVisible();
    expect(screen.getByRole('link', { name: /first post/ })).toHaveAttribute('href', '/connect');
  });

  it('says why the list does not come', async () => {
    renderRoute('/intake', [refuse('GET', '/intake', { status: 503, detail: 'Not now.' })]);
    expect(await screen.findByText('Not now.')).toBeVisible();
  });
});
