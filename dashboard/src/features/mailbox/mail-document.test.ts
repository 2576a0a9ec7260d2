import { describe, expect, it } from 'vitest';
import { mailDocument } from './mail-document';

describe('mailDocument', () => {
  it('lets links leave the frame, from the head of the document on', () => {
    expect(mailDocument('<html><head lang="en"><title>A</title></head></html>')).toBe(
      '<html><head lang="en"><base target="_top"><title>A</title></head></html>',
    );
  });

  it('does not take a header for the head', () => {
    expect(mailDocument('<header>A</header>')).toBe('<base target="_top"><header>A</header>');
  });
});
