import { describe, expect, it } from 'vitest';
import { aProduct } from '@/testing/product-builders';
import { curlCommand, readableJson } from './curl-command';
import { examplePost } from './example-post';

const post = examplePost(aProduct({ partNumber: "O'HM-1" }), 'final', {
  resultId: '4052d593-8bbf-4e71-aae4-536fb9f01ce4',
  startedAt: '2026-11-30T08:15:30.120Z',
});

describe('curlCommand', () => {
  it('writes JSON that reads back as the post', () => {
    expect(JSON.parse(readableJson(post))).toEqual(post);
  });

  it('names address, key and content type', () => {
    const command = curlCommand('http://localhost:4780', 'amk_k7m2p9qx_secret', post);
    expect(command).toContain('curl -i http://localhost:4780/api/v1/results');
    expect(command).toContain("-H 'X-API-Key: amk_k7m2p9qx_secret'");
    expect(command).toContain("-H 'Content-Type: application/json'");
  });

  it('holds a place for the key that was not given', () => {
    expect(curlCommand('http://localhost:4780', '', post)).toContain("'X-API-Key: amk_YOUR_KEY'");
  });

  it('lets no quote of a key or a name end the shell’s text', () => {
    const command = curlCommand('http://localhost:4780', "a'; rm -rf /", post);
    expect(command).toContain(String.raw`X-API-Key: a'\''; rm -rf /'`);
    expect(command).toContain(String.raw`O'\''HM-1`);
  });
});
