import { programme } from '#shared/programme/programme';
import { programmeRemedies } from '#shared/programme/programme-remedies';
import type { PagePlanningAnswer, PagePlanning } from '#shared/programme/page-planning';

const tell = (answer: PagePlanningAnswer): void => postMessage(answer);

/** Plans away from the page, and tells of each better plan on the way. */
addEventListener('message', ({ data }: MessageEvent<PagePlanning>) => {
  const { request, search, seconds, helpsTask, otherSizes = [] } = data;
  if (helpsTask !== undefined) {
    tell({ remedies: programmeRemedies(request, helpsTask, { otherSizes }) });
    return;
  }
  const ends_milliseconds = performance.now() + seconds * 1000;
  const limit = { shouldStop: () => performance.now() >= ends_milliseconds };
  tell({ plan: programme(request, { ...search, limit, onBetter: (better) => tell({ better }) }) });
});
