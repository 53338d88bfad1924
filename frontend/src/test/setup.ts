import '@testing-library/jest-dom/vitest';
import { cleanup, configure } from '@testing-library/react';
import { afterEach, vi } from 'vitest';

configure({ asyncUtilTimeout: 10_000 });

window.matchMedia = (query: string) =>
  ({
    matches: false,
    media: query,
    addEventListener: () => undefined,
    removeEventListener: () => undefined,
    addListener: () => undefined,
    removeListener: () => undefined,
  }) as unknown as MediaQueryList;

class NoResizeObserver {
  observe() {}
  unobserve() {}
  disconnect() {}
}
window.ResizeObserver ??= NoResizeObserver as unknown as typeof ResizeObserver;

window.scrollTo = () => undefined;
HTMLCanvasElement.prototype.getContext = () => null;
Object.defineProperty(HTMLElement.prototype, 'clientWidth', { value: 800 });
Object.defineProperty(HTMLElement.prototype, 'clientHeight', { value: 400 });

afterEach(() => {
  cleanup();
  localStorage.clear();
  vi.unstubAllGlobals();
});
