import '@angular/localize/init';
import { setupZonelessTestEnv } from 'jest-preset-angular/setup-env/zoneless';
import { forbidMadeFunctions } from '../app/core/forbid-made-functions';

setupZonelessTestEnv({ errorOnUnknownElements: true, errorOnUnknownProperties: true });
forbidMadeFunctions();

/** jsdom lays nothing out, so nothing ever changes its size. */
class StillObserver implements ResizeObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

globalThis.ResizeObserver ??= StillObserver;

/** No media query holds: neither dark, nor a phone, nor reduced motion. */
const noMatch = (media: string) => ({
  media,
  matches: false,
  onchange: null,
  addListener() {},
  removeListener() {},
  addEventListener() {},
  removeEventListener() {},
  dispatchEvent: () => false,
});
globalThis.matchMedia ??= ((media: string) => noMatch(media)) as unknown as typeof matchMedia;

/** jsdom's blobs cannot be read as the browser's can. */
function text(this: Blob): Promise<string> {
  return new Promise((resolve) => {
    const reader = new FileReader();
    reader.onload = () => resolve(reader.result as string);
    reader.readAsText(this);
  });
}

if (!('text' in Blob.prototype)) Object.defineProperty(Blob.prototype, 'text', { value: text });
