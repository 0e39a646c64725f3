import { estimateFigures, prepareEstimate } from '#shared/estimates/estimate-figures';
import { startCard } from '#shared/rate-cards/start-card';
import { demonstrationDraft } from '../../seeders/demonstration-draft';
import { demonstrationJobs } from '../../seeders/demonstration-jobs';

describe('The jobs of the demonstration', () => {
  it.each(demonstrationJobs().map((job) => [job.title, job] as const))(
    'place every ornament of the %s in a zone that is taken to be as high as it is',
    (_title, job) => {
      const draft = demonstrationDraft(job, startCard);
      const { findings } = estimateFigures(
        prepareEstimate({ draft, choice: [], card: startCard, currency: 'EUR' }),
        null,
      );
      const ofOrnaments = findings.filter(({ code }) => code === 'carving-in-no-zone' || code === 'carving-zone-flat');
      expect(ofOrnaments).toEqual([]);
    },
  );
});
