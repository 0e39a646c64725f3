export const leaf = {
  'leaf-pieces-along': 'pieces along, {run_mm} in steps of {step_mm}',
  'leaf-lays-across': 'lays across, {girth_mm} in steps of {step_mm}',
  'leaf-strips': '{strips, plural, one {a whole leaf each} other {# strips a leaf}}',
  'leaf-small-pieces': 'small pieces of {girth_mm} by {run_mm}, {across} by {along} from a leaf',
  'leaf-courses':
    '{courses, plural, one {one course} other {# courses}} of {along, plural, one {one leaf} other {# leaves}}, {length_mm} by {height_mm} in steps of {step_mm}',
  'leaf-narrow-strip':
    'less than a leaf wide: a strip of {strip_mm} from {length_mm} by {height_mm}, {along, plural, one {one piece} other {# pieces}}, {strips, plural, one {one} other {#}} from a leaf',
  'leaf-last-strip':
    'last strip {strip_mm} wide, {along, plural, one {one piece} other {# pieces}}, {strips, plural, one {one} other {#}} from a leaf',
  'leaf-by-area': 'by area, {area_mm2} in squares of {step_mm}',
  'leaf-patches': 'patches, {area_mm2}, each leaf cut {cuts} by {cuts} and covering a square of {step_mm}',
  'leaf-ribbon': '{pieces, plural, one {one length} other {# lengths}} of ribbon, {length_mm} together, in rolls',
  'leaf-openings': 'without openings of {openings_mm2}',
  'leaf-share': 'share of the member',
  'leaf-members': 'identical members',
  'leaf-relief':
    'relief, {relief, select, flat {flat} low {low} middle {middle} high {high} pierced {pierced} other {in the round}}',
  'leaf-net': 'net, for {area_mm2} of true surface',
  'leaf-second-laying': 'second laying',
  'leaf-second-burnished': 'second laying of the burnished {share_percent}',
  'leaf-second-matte': 'second laying of the matte {share_percent}',
  'leaf-second-blended': 'second laying of the whole, each by its share',
  'leaf-second-parted':
    'Second laying, water gilt, {share_percent} burnished and the rest matte, {way, select, sheets {sheets} lays {lays} other {patches}}',
  'leaf-faulting': 'faulting of the rest',
  'leaf-breakage': 'breakage',
  'leaf-leaves': 'leaves, {low, number, ::.#} to {high, number, ::.#} where all losses go well or badly at once',
  'leaf-rolls':
    'rolls of ribbon, {low, number, ::.##} to {high, number, ::.##} where all losses go well or badly at once',
  'leaf-total-net': 'net, all zones',
  'leaf-total-gross': 'with second laying, faulting and breakage',
  'leaf-total-booklets': 'whole booklets of {leaves, plural, one {one leaf} other {# leaves}}',
  'leaf-order-need': 'leaves that suffice {percentile} times in a hundred',
  'leaf-order-spare': 'spare leaves of the same batch',
  'leaf-unknown': 'The rate card has no leaf “{leaf}”, so none is counted here.',
  'leaf-parts-unknown':
    '{parts, plural, one {A part of the girth this zone takes is} other {# parts of the girth this zone takes are}} no longer in the shape.',
  'leaf-lays-need-run': 'This shape has no girth and run to lay along, so the leaf is counted in patches.',
  'leaf-lap-too-wide': 'A lap of {lap_mm} leaves nothing of a leaf of {side_mm}; a leaf must be wider than two laps.',
  'leaf-strips-too-narrow':
    '{strips} strips a leaf are narrower than two laps of {lap_mm}; the leaf is counted in the cheapest strips that are not.',
  'leaf-cuts-too-small': 'Leaf cut {cuts} by {cuts} is smaller than two laps of {lap_mm}; choose fewer cuts.',
  'leaf-silver-unsealed':
    '{leaf} tarnishes and needs a seal: {system, select, water {the day it is burnished} other {two to five days after it is laid on oil}}.',
  'leaf-unsealed': '{leaf} darkens in the air and needs a seal.',
  'leaf-base-metal-on-water': '{leaf} is laid on oil or water-borne size only; choose a build-up with one of these.',
  'leaf-transfer-on-water': 'Transfer leaf cannot be laid by water gilding; choose loose leaf or another build-up.',
  'leaf-transfer-on-carving':
    'Transfer leaf is slow on carving: it has to be pressed into every hollow. Loose leaf is quicker.',
  'leaf-ribbon-not-flat': 'Ribbon leaf is for flat, plain work; choose leaves here.',
  'leaf-one-batch': 'Take all {leaf} of this job from one batch: colour and thickness differ from batch to batch.',
  'leaf-thickness-outside':
    '{leaf} works out at {implied_µm} thick; leaf of this metal is {least_µm} to {most_µm}. Check its weight, its side and how many leaves the weight is for.',
  'leaf-thickness-differs':
    '{leaf} is stated as {stated_µm} thick, but its weight and side make it {implied_µm}. One of the three is wrong.',
  'leaf-alloy-empty': 'Say what the leaf is made of.',
  'leaf-ribbon-length': 'Say how long a roll of ribbon is.',
  'leaf-no-ribbon': 'Only ribbon has a length; leave this empty for leaves.',
  'leaf-pack-twice': 'Give each pack size once.',
} as const;
