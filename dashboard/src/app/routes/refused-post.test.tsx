import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { answer, refuse } from '@/testing/handlers';
import { aRefusedPost } from '@/testing/intake-builders';
import { renderRoute } from '@/testing/render-route';
import type { RefusedPost } from '@/types/api';

const post = (overrides: Partial<RefusedPost> = {}) =>
  answer('GET', '/intake/refused/x1', aRefusedPost(overrides));

describe('the page of a refused post', () => {
  it('marks the place of each reason in the body and goes there', async () => {
    const { user } = renderRoute('/intake/refused/x1', [post()]);
    const body = await screen.findByRole('region', { name: 'The posted body' });
    const mark = within(body).getByText('"done"');
    expect(mark.tagName).toBe('MARK');
    expect(within(body).getByText('Must be one of: completed, aborted.')).toBeVisible();
    await user.click(screen.getByRole('button', { name: 'Go to place 1' }));
    expect(mark).toHaveFocus();
  });

  it('shows markup in a body as text', async () => {
    const hostile = '{"serialNumber": <img src=x onerror=alert(1)>}';
    renderRoute('/intake/refused/x1', [
      post({
        status: 400,
        body: hostile,
        errors: [{ pointer: '/serialNumber', code: 'json', detail: 'Unexpected token <.' }],
      }),
    ]);
    const body = await screen.findByRole('region', { name: 'The posted body' });
    expect(body).toHaveTextContent('<img src=x onerror=alert(1)>');
    expect(body.querySelector('img')).toBeNull();
  });

  it('sets a body of one long line out in lines, and back', async () => {
    const body = JSON.stringify({ outcome: 'done', notes: 'n'.repeat(200) });
    const { user } = renderRoute('/intake/refused/x1', [post({ body })]);
    const region = await screen.findByRole('region', { name: 'The posted body' });
    expect(within(region).getAllByRole('listitem')).toHaveLength(4);
    await user.click(screen.getByRole('button', { name: 'Show as received' }));
    expect(within(region).getAllByRole('listitem')).toHaveLength(1);
    expect(within(region).getByText('"done"')).toBeVisible();
  });

  it('says that a long body was cut off', async () => {
    renderRoute('/intake/refused/x1', [post({ bodyTruncated: true, bodyBytes: 900000 })]);
    expect(await screen.findByText('the beginning of 900,000 bytes; the rest was not kept')).toBeVisible();
  });

  it('shows the detail where no place is known', async () => {
    renderRoute('/intake/refused/x1', [
      post({ status: 409, errors: [], detail: 'The resultId is taken by other content.' }),
    ]);
    expect(await screen.findAllByText('The resultId is taken by other content.')).not.toHaveLength(0);
    expect(screen.getByText('409 identity taken')).toBeVisible();
  });

  it('says that there is no such post', async () => {
    renderRoute('/intake/refused/x9', [
      refuse('GET', '/intake/refused/x9', { status: 404, detail: 'This post is not here.' }),
    ]);
    expect(await screen.findByText('This post is not here.')).toBeVisible();
  });
});
