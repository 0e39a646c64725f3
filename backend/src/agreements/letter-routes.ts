import {
  keepLetterTemplate,
  listGivenUpLetters,
  listLetterTemplates,
  previewLetter,
  resetLetterTemplate,
  sendLetterAgain,
} from '#shared/agreements/letters-endpoints';
import { mount, type Route } from '../platform/http/mount';
import { presentGivenUpLetter } from './given-up-letter-presenter';
import type { LetterService } from './letter-service';
import type { LetterTemplateService } from './letter-template-service';

export const letterRoutes = (letters: LetterService, templates: LetterTemplateService): Route[] => [
  mount(listLetterTemplates, async ({ actor }) => ({ items: await templates.all(actor.workshopId) })),
  mount(
    keepLetterTemplate,
    ({ actor, version, body: { kind, ...text } }) => templates.keep(actor, { kind, version }, text),
    templates.present,
  ),
  mount(resetLetterTemplate, ({ actor, body }) => templates.reset(actor, body.kind)),
  mount(previewLetter, ({ actor, body: { kind, ...text } }) => letters.preview(actor.workshopId, kind, text)),
  mount(listGivenUpLetters, async ({ actor }) => {
    const given = await letters.givenUp(actor.workshopId);
    return { items: given.map(presentGivenUpLetter) };
  }),
  mount(sendLetterAgain, ({ actor, params }) => letters.sendAgain(actor.workshopId, params.letterId)),
];
