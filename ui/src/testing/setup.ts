import '@testing-library/jest-dom/vitest';
import { cleanup, configure } from '@testing-library/react';
import { afterEach, vi } from 'vitest';

// Screens load when they are first wanted, which takes its time on a busy machine.
configure({ asyncUtilTimeout: 8000 });

// jsdom lays nothing out, so what measures the page is given steady answers.
class SteadyResizeObserver implements ResizeObserver {
  observe() {}
  unobserve() {}
  disconnect() {}
}

class FlatMatrix {
  m22 = 1;
}

vi.stubGlobal('ResizeObserver', SteadyResizeObserver);
vi.stubGlobal('DOMMatrixReadOnly', FlatMatrix);

window.matchMedia ??= (query: string) =>
  ({
    matches: false,
    media: query,
    onchange: null,
    addEventListener: () => {},
    removeEventListener: () => {},
    addListener: () => {},
    removeListener: () => {},
    dispatchEvent: () => false,
  }) as MediaQueryList;

Element.prototype.scrollIntoView ??= () => {};
window.scrollTo = () => {};

Object.defineProperties(HTMLElement.prototype, {
  offsetHeight: { configurable: true, get: () => 600 },
  offsetWidth: { configurable: true, get: () => 800 },
});

Object.defineProperty(SVGElement.prototype, 'getBBox', {
  configurable: true,
  value: () => ({ x: 0, y: 0, width: 40, height: 20 }),
});

afterEach(() => {
  cleanup();
  sessionStorage.clear();
  localStorage.clear();
});
