import { setupZonelessTestEnv } from 'jest-preset-angular/setup-env/zoneless';

setupZonelessTestEnv({ errorOnUnknownElements: true, errorOnUnknownProperties: true });

class SilentResizeObserver implements ResizeObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

// jsdom lacks both: the chart directive refuses to start without an observer, and every text measurement prints a warning.
globalThis.ResizeObserver = SilentResizeObserver;
HTMLCanvasElement.prototype.getContext = () => null;
