/** Ends after the next picture of the page was drawn; where none is, as in a tab behind others, after a while. */
export const oncePainted = (window: Window, longest_ms = 200): Promise<void> =>
  new Promise((resolve) => {
    const drawn = () => window.setTimeout(resolve);
    window.requestAnimationFrame(() => window.requestAnimationFrame(drawn));
    window.setTimeout(resolve, longest_ms);
  });
