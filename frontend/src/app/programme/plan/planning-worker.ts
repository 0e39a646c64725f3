import { programme } from '#shared/programme/programme';
import { programmeRemedies } from '#shared/programme/programme-remedies';
import type { PagePlanningAnswer, PagePlanning } from '#shared/programme/page-planning';

/** Whether something helps is seen from one plan; how well it would, nobody asks of many ways at once. */
const helpLimit = { nodes: 0 };

const tell = (answer: PagePlanningAnswer): void => postMessage(answer);

/** Plans away from the page, and tells of each better plan on the way. */
addEventListener('message', ({ data }: MessageEvent<PagePlanning>) => {
  const { request, search, seconds, helpsTask, otherSizes = [] } = data;
  if (helpsTask !== undefined) {
    tell({ remedies: programmeRemedies(request, helpsTask, { otherSizes, search: { ...search, limit: helpLimit } }) });
    return;
  }
  const ends_milliseconds = performance.now() + seconds * 1000;
  const limit = { shouldStop: () => performance.now() >= ends_milliseconds };
  tell({ plan: programme(request, { ...search, limit, onBetter: (better) => tell({ better }) }) });
});
