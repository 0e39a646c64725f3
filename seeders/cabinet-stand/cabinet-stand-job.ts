import { v7 as newId } from 'uuid';
import type { DemonstrationJob } from '../demonstration-job';
import { cabinetStandFrame } from './cabinet-stand-frame';
import { cabinetStandLegs } from './cabinet-stand-legs';
import { cabinetStandSettings } from './cabinet-stand-settings';

const particulars = {
  client: {
    name: 'Verrall & Osgood, Dealers in Furniture',
    kind: 'firm',
    contact: 'Lucian Osgood',
    email: 'lucian@verrallosgood.example',
    telephone: '+353 1 555 0188',
    address: 'Verrall & Osgood\n22 Sable Row\nDunmara',
    website: 'https://verrallosgood.example',
    taxRegistration: 'IE9999999XX',
    note: 'Wants the shop name on the drawing, not on the stand.',
  },
  job: {
    title: 'Stand for a lacquer cabinet',
    kind: 'new',
    reference: 'Stock 1184',
    site: 'Sable Row, first floor; stairs turn twice',
    note: 'The cabinet weighs 94 kg: the frame is to be checked by their engineer before it is carved.',
  },
  title: 'Cabinet stand, gilt on oil with silver',
  issueNote: 'With the paler toning you chose from the board.',
  stands: 'accepted',
  thread: [],
  changedSince: [],
} as const satisfies Omit<DemonstrationJob, 'pieces' | 'settings'>;

/** An oil-gilt stand with sealed and toned silver details for a dealer's cabinet. */
export function cabinetStandJob(): DemonstrationJob {
  const { members: legs, alternatives } = cabinetStandLegs();
  const note = 'Six legs; the two at the back are plain.';
  const piece = { id: newId(), name: 'Cabinet stand', note, members: [...cabinetStandFrame(), ...legs] };
  return { ...particulars, pieces: [piece], settings: cabinetStandSettings(alternatives) };
}
