import { describe, expect, it } from 'vitest';
import { isFetchFailure } from './fetch-failure';

describe('code of a page that did not arrive', () => {
  it.each([
    'Failed to fetch dynamically imported module: http://localhost/assets/units-1.js',
    'error loading dynamically imported module: http://localhost/assets/units-1.js',
    'Importing a module script failed.',
    'Unable to preload CSS for /assets/units-1.css',
  ])('is known by what a browser or the build says: %s', (message) => {
    expect(isFetchFailure(new TypeError(message))).toBe(true);
  });

  it('is not confused with a fault in the page', () => {
    expect(isFetchFailure(new TypeError("Cannot read properties of undefined (reading 'items')"))).toBe(
      false,
    );
  });
});
