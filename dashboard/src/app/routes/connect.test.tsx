import { screen, within } from '@testing-library/react';
import { describe, expect, it } from 'vitest';
import { aResult } from '@/testing/builders';
import { FakeEventSource } from '@/testing/fake-event-source';
import { answer, refuse, type Handler } from '@/testing/handlers';
import { anAcceptedPost, aRefusedPost } from '@/testing/intake-builders';
import { aProduct } from '@/testing/product-builders';
import { renderRoute } from '@/testing/render-route';
import type { IntakeItem } from '@/types/api';

const products = answer('GET', '/products', [aProduct(), aProduct({ partNumber: 'FH-T250-C' })]);
const noPosts = answer('GET', '/intake', { items: [], nextCursor: null });

const shownCommand = () => screen.queryByRole('region', { name: 'The command' })?.textContent ?? '';
const shownId = () => /"resultId": "([^"]+)"/.exec(shownCommand())?.[1] ?? '';

describe('the worked first post', () => {
  it('puts the key and the chosen product into the command', async () => {
    const { user } = renderRoute('/connect', [products, noPosts]);
    await user.type(await screen.findByLabelText('Key'), 'amk_k7m2p9qx_secret');
    await user.selectOptions(screen.getByLabelText('Part number'), 'FH-T250-C');
    await user.selectOptions(screen.getByLabelText('Stage'), 'board');
    expect(shownCommand()).toContain("'X-API-Key: amk_k7m2p9qx_secret'");
    expect(shownCommand()).toContain('"partNumber": "FH-T250-C"');
    expect(shownCommand()).toContain('"stage": "board"');
    expect(shownCommand()).toContain(`${window.location.origin}/api/v1/results`);
    await user.click(screen.getByRole('button', { name: 'Copy command' }));
    expect(await navigator.clipboard.readText()).toBe(shownCommand());
  });

  it('shows the post as soon as it arrives', async () => {
    let items: IntakeItem[] = [];
    const result: Handler = {
      method: 'GET',
      // The id is new with every visit, so the address is known only then.
      get path() {
        return `/api/v1/results/${shownId()}`;
      },
      respond: () => Response.json(aResult({ resultId: shownId(), serialNumber: 'TRY-1' })),
    };
    renderRoute('/connect', [
      products,
      answer('GET', '/intake', () => ({ items, nextCursor: null })),
      result,
    ]);
    expect(await screen.findByText(/Waiting for the post/)).toBeVisible();
    const resultId = shownId();
    items = [anAcceptedPost({ resultId, station: 'south-1' })];
    FakeEventSource.latest().send({ topic: 'results', id: resultId });
    expect(await screen.findByRole('link', { name: 'See its curve' })).toHaveAttribute(
      'href',
      `/units/FH-R500-W/TRY-1?result=${resultId}`,
    );
  });

  it('says what to mend when it was refused', async () => {
    let items: IntakeItem[] = [];
    renderRoute('/connect', [products, answer('GET', '/intake', () => ({ items, nextCursor: null }))]);
    await screen.findByText(/Waiting for the post/);
    items = [aRefusedPost({ resultId: shownId() })];
    FakeEventSource.latest().send({ topic: 'intake', id: null });
    expect(await screen.findByText('Refused with 422.')).toBeVisible();
    expect(screen.getByRole('link', { name: 'See what to mend' })).toHaveAttribute(
      'href',
      '/intake/refused/x1',
    );
  });

  it('leads to the reference, the errors, the schema and the API document', async () => {
    renderRoute('/connect', [products, noPosts]);
    const links = within(await screen.findByRole('region', { name: 'To look things up' })).getAllByRole(
      'link',
    );
    expect(links.map((link) => link.getAttribute('href'))).toEqual([
      '/docs',
      '/docs/errors',
      '/docs/result.schema.json',
      '/docs/openapi.yaml',
    ]);
  });

  it('says that a post needs a product', async () => {
    renderRoute('/connect', [answer('GET', '/products', []), noPosts]);
    expect(await screen.findByText('No product is set up here yet.')).toBeVisible();
  });

  it('says why the products do not come', async () => {
    renderRoute('/connect', [refuse('GET', '/products', { status: 503, detail: 'Not now.' }), noPosts]);
    expect(await screen.findByText('Not now.')).toBeVisible();
  });
});
