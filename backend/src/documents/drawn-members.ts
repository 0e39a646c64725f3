import type { Member } from '#shared/estimates/member';
import { canonicalJson } from '#shared/estimates/canonical-json';
import type { DrawingView } from '#shared/measure/drawing/drawing';
import { memberDrawing } from '#shared/measure/drawing/member-drawing';
import type { CaptionedFigure } from './paper/figure';
import type { Pdf } from './paper/open-paper';
import { viewFigure } from './paper/view-figure';
import type { PaperWords } from './paper-words';

/** Members of one shape, drawn once. */
interface Shaped {
  readonly names: readonly string[];
  readonly views: readonly DrawingView[];
}

function shaped(members: readonly Member[]): Shaped[] {
  const shapes = new Map<string, Member[]>();
  for (const member of members) {
    const openings = member.openings.map(({ shape, count }) => ({ shape, count }));
    const key = canonicalJson({ shape: member.shape, openings });
    shapes.set(key, [...(shapes.get(key) ?? []), member]);
  }
  return [...shapes.values()].map((alike) => ({
    names: [...new Set(alike.map((member) => member.name))],
    views: memberDrawing(alike[0].shape, alike[0].openings).views,
  }));
}

/** How drawings are set: the box each has, how lengths are written, and whether every part of a profile is measured. */
export interface DrawingSetting {
  readonly box: { readonly width_pt: number; readonly height_pt: number };
  readonly words: PaperWords;
  readonly isForTheBench: boolean;
}

const shownNames = 2;

function captionOf(names: readonly string[], { say }: PaperWords): string {
  const shown = names.slice(0, shownNames).join(', ');
  const more = names.length - shownNames;
  return more > 0 ? say('paper-zones-more', { names: shown, more }) : shown;
}

/** A client looks at the whole; the heights of single elements are for whoever cuts them. */
const measured = (view: DrawingView, isForTheBench: boolean): DrawingView =>
  isForTheBench || view.view !== 'profile'
    ? view
    : { ...view, dimensions: view.dimensions.filter(({ side }) => side !== 'right') };

/** Members drawn to scale, every shape once with the names of all that have it; a measured area has no drawing. */
export function drawnMembers(pdf: Pdf, members: readonly Member[], setting: DrawingSetting): CaptionedFigure[] {
  const { box, words, isForTheBench } = setting;
  return shaped(members).flatMap(({ names, views }) => {
    const caption = captionOf(names, words);
    return views.map((view) => {
      const name = `${caption}, ${words.say('paper-view', { view: view.view })}`;
      const { figure, scale } = viewFigure(pdf, measured(view, isForTheBench), { box, name, length: words.length });
      const drawn = words.say('paper-view-scale', { view: view.view, scale });
      const hasOpenings = view.paths.some(({ kind }) => kind === 'opening');
      return { figure, caption, note: hasOpenings ? words.say('paper-view-openings', { drawn }) : drawn };
    });
  });
}
