import '@testing-library/jest-dom/vitest';
import { cleanup, configure } from '@testing-library/react';
import { afterEach, beforeEach, vi } from 'vitest';
import { FakeEventSource } from './fake-event-source';

// A page's first test also waits until its chunk is compiled.
configure({ asyncUtilTimeout: 10_000 });

// A busy machine may need seconds for what takes milliseconds; a test that passes never waits for this.
configure({ asyncUtilTimeout: 15_000 });

class NoObserver {
  observe() {}
  unobserve() {}
  disconnect() {}
  takeRecords() {
    return [];
  }
}

// What jsdom lacks and the component library asks for while it is imported.
HTMLCanvasElement.prototype.getContext = () => null;
Element.prototype.scrollTo = () => {};
Element.prototype.scrollIntoView = () => {};
window.scrollTo = () => {};
vi.stubGlobal('ResizeObserver', NoObserver);
vi.stubGlobal('IntersectionObserver', NoObserver);
vi.stubGlobal('EventSource', FakeEventSource);
vi.stubGlobal('matchMedia', (query: string) => ({
  matches: false,
  media: query,
  addEventListener() {},
  removeEventListener() {},
  addListener() {},
  removeListener() {},
}));

beforeEach(() => {
  localStorage.clear();
  document.documentElement.dataset.theme = 'day';
});

afterEach(() => {
  cleanup();
  FakeEventSource.reset();
});
