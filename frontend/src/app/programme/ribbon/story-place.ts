const story_px = { width: 340, height: 210 };
const edge_px = 8;

/** Where the story of a task stands: beside it, and never beyond the edge of the window; pixels. */
export function storyPlace(
  { x, y }: { readonly x: number; readonly y: number },
  window: { readonly width: number; readonly height: number },
): { readonly x: number; readonly y: number } {
  const right = window.width - story_px.width - edge_px;
  const isBelow = y > window.height - story_px.height;
  return {
    x: Math.max(edge_px, Math.min(x, right)),
    y: isBelow ? Math.max(edge_px, y - story_px.height - 60) : y,
  };
}
