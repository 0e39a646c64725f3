import { v7 as newId } from 'uuid';
import type { DemonstrationJob } from '../demonstration-job';
import type { MemberEntry } from '../entries/member-entry';
import { paintedPlinthBand } from './painted-plinth-band';
import { paintedPlinthMouldings } from './painted-plinth-mouldings';
import { paintedPlinthSettings } from './painted-plinth-settings';

const particulars = {
  client: {
    name: 'Kilbrone Museum of Clocks',
    kind: 'institution',
    contact: 'Dr Imre Szolnoky',
    email: 'collections@kilbrone.example',
    telephone: '+353 1 555 0136',
    address: 'Kilbrone Museum of Clocks\n3 Weir Street\nKilbrone',
    website: 'https://kilbrone.example',
    taxRegistration: '',
    note: 'Orders are signed by the keeper; invoices by post as well.',
  },
  job: {
    title: 'Half-round plinth for the musical clock',
    kind: 'new',
    reference: 'KMC-OBJ-0417',
    site: 'Gallery 2, against the north wall',
    note: 'Climate of the gallery is kept at 20 °C and 50 %.',
  },
  title: 'Painted plinth under gilt mouldings',
  issueNote: 'The medallions are priced as painted by one hand.',
  stands: 'issued',
  thread: [],
} as const satisfies Omit<DemonstrationJob, 'pieces' | 'settings' | 'changedSince'>;

/** The keeper has since found two more engravings. */
const isOfMedallions = ({ name }: MemberEntry['content']): boolean => name.toLowerCase().includes('medallion');
const withFive = ({ id, content }: MemberEntry): MemberEntry => ({ id, content: { ...content, count: 5 } });

/** A curved plinth painted in glazes over white, between gilt mouldings, for a museum. */
export function paintedPlinthJob(): DemonstrationJob {
  const members = [...paintedPlinthBand(), ...paintedPlinthMouldings()];
  const changedSince = members.filter(({ content }) => isOfMedallions(content)).map(withFive);
  const piece = { id: newId(), name: 'Plinth', note: 'Half round in front, straight at the back.', members };
  return { ...particulars, pieces: [piece], settings: paintedPlinthSettings(), changedSince };
}
