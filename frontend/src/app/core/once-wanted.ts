/** What a person does who is about to read on. */
const signs = ['pointerdown', 'wheel', 'scroll', 'keydown', 'focusin'];

/**
 * Ends when what is not shown yet is wanted, and whether all of it is: because a person did something, or `longest_ms` went by; where merely its
 * place came into view, the next of it may be enough.
 */
export const onceWanted = (window: Window, place: Element | null, longest_ms: number): Promise<boolean> =>
  new Promise((resolve) => {
    const ended = new AbortController();
    const { signal } = ended;
    const end = (isAllWanted: boolean) => {
      ended.abort();
      resolve(isAllWanted);
    };
    const all = () => end(true);
    const latest = window.setTimeout(all, longest_ms);
    signal.addEventListener('abort', () => window.clearTimeout(latest));
    for (const sign of signs) window.addEventListener(sign, all, { signal, passive: true, capture: true });
    if (place) onceSeen(place, signal, () => end(false));
  });

function onceSeen(place: Element, signal: AbortSignal, seen: () => void): void {
  if (!('IntersectionObserver' in globalThis)) return;
  const observer = new IntersectionObserver((entries) => {
    if (entries.some(({ isIntersecting }) => isIntersecting)) seen();
  });
  observer.observe(place);
  signal.addEventListener('abort', () => observer.disconnect());
}
