import { existsSync } from 'node:fs';

const usualPlaces = ['/usr/bin/chromium', '/usr/bin/chromium-browser', '/usr/bin/google-chrome'];

/** Where Chromium is: CHROMIUM_PATH says, else the usual places are tried. `null` when there is none. */
export function findBrowser(): string | null {
  const told = process.env.CHROMIUM_PATH;
  const places = told ? [told] : usualPlaces;
  return places.find((place) => existsSync(place)) ?? null;
}
