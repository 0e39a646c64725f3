import { paperNames } from '../estimate/paper-names';
import { Sheet } from './sheet';
import type { WorkbookFacts } from './workbook-facts';

/** What the workbook is and how it is read. */
export function aboutSheet({ words, snapshot, settings }: WorkbookFacts, unit: string): Sheet {
  const { say } = words;
  const { estimate, job, client, workshop, issuedOn } = snapshot;
  const sheet = new Sheet(say('sheet-about'), [
    { width: 26, format: '' },
    { width: 90, format: '' },
  ]);
  sheet.add([workshop.name], 'part');
  const { kind, varies } = paperNames(snapshot, words);
  sheet.add([kind, say('paper-number-letter', { number: estimate.number, letter: estimate.letter })]);
  if (varies !== '') sheet.add([say('paper-varies'), varies]);
  sheet.add([say('paper-job'), [job.number, job.title].filter(Boolean).join(', ')]);
  sheet.add([say('sheet-title'), settings.title]);
  sheet.add([say('sheet-client'), client.name]);
  sheet.add([say('paper-date'), words.day(issuedOn)]);
  sheet.add([say('sheet-currency'), workshop.currency]);
  sheet.add([]);
  const notes = ['inputs', 'flow', 'rounding', 'shares', 'risk'] as const;
  for (const note of notes) sheet.add([say(`sheet-about-${note}`), say(`sheet-about-${note}-text`, { unit })]);
  return sheet;
}
