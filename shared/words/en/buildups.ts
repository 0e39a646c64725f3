export const buildups = {
  'buildup-unknown': 'The rate card holds no build-up called {buildup}.',
  'buildup-edge-not-in-steps': '{edge_mm} of edge is to be protected, but {buildup} has no step that protects it.',
  'buildup-hours-by-area':
    '{step}: {area_mm2} × {coats, plural, one {# coat} other {# coats}} × {rate_hours} a square metre{ofSquareMetre} × {factor, number} for the finish of the surface.',
  'buildup-hours-painted':
    '{step} on painted ornament: {area_mm2} × {coats, plural, one {# coat} other {# coats}} × {rate_hours} a square decimetre{ofSquareDecimetre}.',
  'buildup-hours-by-laying':
    '{step}: {laid, number} {way, select, lays {pieces} other {leaves}} handled, broken ones included, at {rate, number} minutes each.',
  'buildup-hours-by-edge': '{step}: {edge_mm} of edge at {rate_hours} a metre{ofMetre}.',
  'buildup-hours-restoring': '{step}: {area_mm2} at {rate_hours} a square metre{ofSquareMetre}.',
  'buildup-hours-recutting': '{step}: as worked out with the carving, and counted there.',
  'buildup-hours-set-up':
    '{step}: set-up of {rate_hours} on {days, plural, one {# day} other {# days}} for the whole lot, as many as its hours and its drying take by themselves. In the sequence it may stand on more days, since a working day can end in between; these are not charged.',
  'buildup-ground-thickness': 'Ground of {coats, plural, one {# coat} other {# coats}}, {thickness_mm} in all.',
  'buildup-ground-thick':
    'The ground comes to {thickness_mm}, more than {limit_mm}, on carving that is not recut: detail will drown. Take fewer coats, or recut in gesso.',
  'buildup-allow-joints':
    'Allow {thickness_mm} for the ground at every joint face and {socket_mm} across sockets and dowel holes, or keep them bare.',
  'buildup-size-rises':
    '{step} is bound with {recipe}, stronger than {before} beneath it. A stronger layer pulls a weaker one off: size never gains strength from layer to layer.',
  'buildup-recipe-unknown': '{step} asks for recipe {recipe}, which the rate card does not hold.',
  'buildup-material-unknown': '{step} asks for material {material}, which the rate card does not hold.',
  'buildup-bulk-unknown':
    '{material} is mixed by volume and bought by weight, but the rate card does not say what a litre of it weighs.',
  'buildup-material-bought':
    '{material}: {need, number} {unit} needed, {bought, number} {unit} bought in {packs, plural, one {# pack} other {# packs}}.',
  'buildup-material-pro-rata': '{material}: {need, number} {unit} charged as it is used.',
  'buildup-material-no-pack': '{material} has no packs in the rate card, so it is charged as it is used.',
  'buildup-batch-part':
    '{part}: {parts, plural, one {# part} other {# parts}} of {total, number} in a batch of {batch_litres}.',
  'buildup-one-batch':
    'Make one batch of size for the whole ground of a piece: two batches are never of quite one strength.',
  'buildup-water-outdoors':
    'Water gilding does not stand weather or wet. {buildup} is ruled out here; oil gilding on a sealed ground may serve.',
  'buildup-order-of-systems': 'Gild and burnish in water first, protect the edge, then size and gild in oil.',
  'caution-wood-dust':
    '{steps}: dust of hard and soft woods can cause cancer (IARC Group 1). Draw it off at the source and wear a mask that is meant for it.',
  'caution-whiting-dust':
    '{steps}: dry whiting and gesso raise a fine dust. Mix and rub down with extraction or a damp cloth, and wear a mask.',
  'caution-silica':
    '{steps}: natural chalk, clay bole, pumice and tripoli rubbed dry may give off crystalline silica, which harms the lungs for good. Work damp or with extraction.',
  'caution-lead': '{steps}: old coatings may hold lead. Have them tested before anything is sanded, scraped or heated.',
  'caution-solvents':
    '{steps}: solvent vapours. Air the room well, keep flames and sparks away and wear suitable gloves.',
  'caution-spirit-near-heat':
    '{steps}: spirit and its vapour catch fire. Keep them well away from glue pots, hotplates and heaters.',
  'caution-isocyanates':
    '{steps}: a two-pack lacquer, if one is chosen, holds isocyanates, which can bring on asthma. It needs air-fed breathing protection.',
  'caution-oily-rags':
    '{steps}: rags wet with oil heat up by themselves and can catch fire. Spread them out to dry or keep them under water in a lidded tin.',
  'caution-glue-allergy':
    '{steps}: animal glue can cause allergy of skin and breath. Gloves, and no breathing in of the powder.',
  'caution-glue-heat': '{steps}: never let glue pass 55\u00a0°C (131\u00a0°F). It loses its strength.',
  'caution-lifting':
    '{what}: heavy or unwieldy. Lift with two or more, or with a trolley or hoist, and clear the way first; carry by the carcase, never by the carving.',
  'caution-top-on-base':
    'A heavy or loose top on a carved or narrow base: have a structural engineer check base and fixing before it is set on it.',
  'caution-defer': 'Follow local codes and the product’s safety data sheet; ask a licensed professional.',
  'buildup-window-closed': 'The next coat cannot be due before it may be put on.',
  'buildup-lag-leads-nowhere': 'This has to name a later step of the same build-up.',
  'buildup-no-mercury': 'Mercury (fire) gilding is never offered here: its vapour poisons.',
  'buildup-part-material': 'Water has no material; every other part of a recipe has one.',
  'card-reference-unknown': 'The rate card holds no item {id}.',
} as const;
