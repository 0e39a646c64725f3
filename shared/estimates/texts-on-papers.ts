import type { Draft } from '#shared/estimates/draft';
import type { Alternative, EstimateSettings, ExtraLine } from '#shared/estimates/settings';
import type { Member, Piece } from '#shared/estimates/member';
import type { TextOnPaper } from '#shared/words/letter-findings';

const text = (part: string, text: string): TextOnPaper => ({ part, name: '', text });

function ofSettings({ title, introduction, included, excluded, terms, stages }: EstimateSettings): TextOnPaper[] {
  return [
    ...Object.entries({ title, introduction, included, excluded, terms }).map((entry) => text(...entry)),
    ...stages.parts.map(({ name }) => ({ part: 'stage', name, text: name })),
  ];
}

const ofExtra = ({ id, name, ...line }: ExtraLine): TextOnPaper => {
  const measured = line.kind === 'paid-quantity' ? [line.unit, line.rule] : [];
  return { part: 'line', name, text: [name, ...measured].join('\n'), about: id };
};

const ofAlternative = ({ name, group, note }: Alternative): TextOnPaper => ({
  part: 'alternative',
  name,
  text: [name, group, note].join('\n'),
});

const ofPiece = ({ name, note }: Piece): TextOnPaper => ({ part: 'piece', name, text: [name, note].join('\n') });

const ofMember = ({ id, name, lot, note, zones }: Member): TextOnPaper[] => [
  { part: 'member', name, text: [name, lot, note].join('\n'), about: id },
  ...zones.map((zone) => ({ part: 'zone', name: zone.name, text: zone.name, about: zone.id })),
];

/** Every text of a draft that a person wrote and that stands on its estimate or its bench sheets, with what it belongs to. */
export const textsOnPapers = ({ settings, pieces, members }: Draft): TextOnPaper[] => [
  ...ofSettings(settings),
  ...settings.extras.map(ofExtra),
  ...settings.alternatives.map(ofAlternative),
  ...pieces.map(ofPiece),
  ...members.flatMap(ofMember),
];
