import { v7 as newId } from 'uuid';
import type { DemonstrationJob } from '../demonstration-job';
import { pierTableApron } from './pier-table-apron';
import { pierTableLegs } from './pier-table-legs';
import { pierTableSettings } from './pier-table-settings';
import { pierTableStretcher } from './pier-table-stretcher';

const particulars = {
  client: {
    name: 'Ardnamara House Trust',
    kind: 'institution',
    contact: 'Hester Quillane',
    email: 'works@ardnamara.example',
    telephone: '+353 1 555 0171',
    address: 'Ardnamara House\nThe Demesne\nArdnamara',
    website: 'https://ardnamara.example',
    taxRegistration: '',
    note: 'Papers go to the works committee; it meets on the first Tuesday of the month.',
  },
  job: {
    title: 'Pier-table base for the long drawing room',
    kind: 'new',
    reference: 'AHT 27/4',
    site: 'Ardnamara House, long drawing room, east pier',
    note: 'Pair to the table on the west pier, which stays in place and may be measured on Thursdays.',
  },
  title: 'Pier-table base, carved and water gilt',
  issueNote: 'As discussed in the drawing room.',
  stands: 'sent',
  thread: [
    {
      question: 'Would the burnished parts match the table on the west pier, which has dulled a good deal?',
      answer:
        'We would tone the new work down to it on a sample board first, and bring the board to the house for you to choose from.',
    },
    {
      question:
        'The committee meets on the first Tuesday. Could the feet be left plain for the moment, and be carved next year?',
      answer: '',
    },
  ],
  changedSince: [],
} as const satisfies Omit<DemonstrationJob, 'pieces' | 'settings'>;

/** A water-gilt pier-table base, burnished and matte, for a country house. */
export function pierTableJob(): DemonstrationJob {
  const { members: legs, alternatives } = pierTableLegs();
  const members = [...legs, ...pierTableApron(), ...pierTableStretcher()];
  const piece = { id: newId(), name: 'Pier-table base', note: 'Height without marble 33 7/8 in.', members };
  return { ...particulars, pieces: [piece], settings: pierTableSettings(alternatives) };
}
