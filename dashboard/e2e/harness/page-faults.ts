import type { ConsoleMessage, Page } from 'playwright-core';

/** What a page complained of. */
export interface PageFaults {
  readonly all: readonly string[];
  /** Complaints that match are part of the journey from now on. Answers the way to take that back. */
  expect(pattern: RegExp): () => void;
}

/** Asking who is signed in is answered 401 for nobody, and the browser writes every 401 into its console. */
const nobodySignedIn = /status of 401 .*\/api\/v1\/session$/;

/** Collects console errors and warnings, and errors that no one caught, from now on. */
export function watchPage(page: Page): PageFaults {
  const all: string[] = [];
  const expected = [nobodySignedIn];
  const note = (words: string) => {
    if (!expected.some((pattern) => pattern.test(words))) all.push(words);
  };
  page.on('console', (message) => {
    if (isComplaint(message)) note(`console ${message.type()}: ${message.text()} ${message.location().url}`);
  });
  page.on('pageerror', (error) => note(`uncaught: ${error.stack ?? error.message}`));
  return {
    all,
    expect: (pattern) => {
      expected.push(pattern);
      return () => expected.splice(expected.indexOf(pattern), 1);
    },
  };
}

const isComplaint = (message: ConsoleMessage) => ['error', 'warning', 'assert'].includes(message.type());
