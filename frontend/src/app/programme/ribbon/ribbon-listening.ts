/** What is done when something happens to the element a ribbon scrolls in. */
export interface RibbonListener {
  follow(): void;
  measure(element: HTMLElement): void;
  move(event: PointerEvent): void;
  leave(): void;
  choose(event: MouseEvent): void;
  turn(event: WheelEvent): void;
}

/** Listens to what happens often; answers how to stop. Not from a template, where each event would look at the whole of it again. */
export function ribbonListening(element: HTMLElement, listener: RibbonListener): () => void {
  const ended = new AbortController();
  const { signal } = ended;
  const observer = new ResizeObserver(() => listener.measure(element));
  observer.observe(element);
  element.addEventListener('scroll', () => listener.follow(), { signal, passive: true });
  element.addEventListener('pointermove', (event) => listener.move(event), { signal });
  element.addEventListener('pointerleave', () => listener.leave(), { signal });
  element.addEventListener('click', (event) => listener.choose(event), { signal });
  element.addEventListener('wheel', (event) => listener.turn(event), { signal, passive: false });
  return () => {
    observer.disconnect();
    ended.abort();
  };
}
