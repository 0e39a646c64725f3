export const carving = {
  'carving-first-piece': 'first {ornament}, at {reference_mm}',
  'carving-each': '{ornament}, each',
  'carving-first-length': '{ornament}, each {reference_mm} of run',
  'carving-first-area': '{ornament}, each square of {reference_mm}',
  'carving-size': 'size {size_mm}, against {reference_mm}',
  'carving-timber': 'timber, {timber}',
  'carving-relief':
    'relief, {relief, select, flat {flat} low {low} middle {middle} high {high} pierced {pierced} other {in the round}} for {reference, select, flat {flat} low {low} middle {middle} high {high} pierced {pierced} other {in the round}}',
  'carving-undercut': 'undercut',
  'carving-plan': 'curved on plan, {plan, select, straight {straight} other {swept}}',
  'carving-pieces': '{members, plural, one {pieces on one member} other {pieces on # members}}',
  'carving-repeats': 'whole repeats, {free_mm} at {pitch_mm}{runs, plural, one {} other {, # runs}}',
  'carving-amount': 'times over',
  'carving-learning':
    'each after learning over {pieces, plural, one {one piece} other {# pieces}}, {rate_percent} {model, select, unit {for the unit} other {on average}}',
  'carving-hours': 'hours, {low_hours} to {high_hours}',
  'carving-recut-share':
    '{manner, select, french {recut in the French manner} other {recut in gesso}}, {share_percent} of {carving_hours}',
  'carving-recut-area':
    '{manner, select, french {recut in the French manner} other {recut in gesso}}, {area_mm2} at {each_hours} a square metre{ofSquareMetre}',
  'carving-total-ornament': 'ornament',
  'carving-total-items': 'shaping and free carving',
  'carving-total-once': 'drawing, patterns and other work done once',
  'carving-total-sharpening': 'sharpening, {sharpening_percent} of the carving',
  'carving-total-recutting': 'recutting in gesso',
  'carving-ornament-unknown': 'The rate card has no ornament “{ornament}”, so its hours are missing.',
  'carving-timber-unknown':
    'The rate card has no timber “{timber}”, so the hours are left as for the reference timber.',
  'carving-extent-unfit':
    '{ornament} is counted {way, select, piece {by the piece or along a run} length {along a run} other {by area}}; please give it that way.',
  'carving-run-too-short':
    'The mitre leaves and the centrepiece take up the whole run of {run_mm}: there is no room left for {ornament}.',
  'carving-size-outside':
    'At {size_mm} the ornament is less than half or more than twice its reference of {reference_mm}; the hours are a long way from anything timed.',
  'carving-stretch-outside':
    'Whole repeats come to {pitch_mm} each, {stretch_percent} off the module; more than {tolerance_percent} shows to the eye.',
  'carving-in-no-zone':
    '{ornament} stands in no zone of {member}: recutting, leaf and hands-on work there go by the plain surface.',
  'carving-zone-flat':
    '{ornament} on {member} stands in the zone “{zone}”, whose relief is flat: its true surface is then taken as flat.',
  'carving-wood-dust':
    'Wood dust, of soft and hard timber alike, is known to cause cancer (IARC Group 1). Extract it at the source and wear a mask. Follow local codes and the product’s safety data sheet; ask a licensed professional.',
  'carving-run-taken': 'The mitre leaves and the centrepiece are longer than the run.',
  'carving-stages-not-whole': 'The shares of the stages must come to exactly 100%.',
} as const;
