export const measure = {
  // Explanations of a surface
  'measure-triangle': 'Base times half the height, {base_mm} × {half_mm}',
  'measure-circle': 'Circle, π × the radius squared: π × {radius_mm} × {radius_mm}',
  'measure-ellipse': 'Oval, π × half its length × half its height: π × {length_mm} × {height_mm}',
  'measure-outline-out': 'Below the sides that run one way, each its length along × its mean height',
  'measure-outline-back': 'Less what lies below the sides that run back',
  'measure-ball': 'Ball, π × the diameter squared: π × {diameter_mm} × {diameter_mm}',
  'measure-ball-zone': 'As on a ball, π × the diameter × the height that is kept: π × {diameter_mm} × {height_mm}',
  'measure-spheroid': 'For a body {diameter_mm} across and {height_mm} high instead of a ball, by its exact integral',
  'measure-face':
    '{face, select, top {Top} bottom {Bottom} front {Front} back {Back} left {Left side} other {Right side}}, {length_mm} × {height_mm}',
  'measure-boss-rise': 'Its rise adds π × the height squared: π × {height_mm} × {height_mm}',
  'measure-girth-straight': 'Girth of the section before it is twisted',
  'measure-girth': 'Girth across',
  'measure-run': 'Run along',
  'measure-slant': 'Slope of the sides adds to the length',
  'measure-profile-girth': 'Girth of the profile, {elements, plural, one {# element} other {# elements together}}',
  'measure-plan-run':
    'Run through the middle of the profile’s curve, {offset_mm} from the {edge, select, front {front} other {back}} edge, where the plan was measured',
  'measure-turned-run': 'Circumference at the middle of the profile’s curve',
  'measure-fluting': 'Girth multiplied by the flutes, reeds or grooves cut along it',
  'measure-twist': 'The twist lengthens that girth',
  'measure-helicoid-turn': 'One turn of the ribbon, one face',
  'measure-turns': 'Turns',
  'measure-ends': 'Chosen ends',
  'measure-stations': 'Mean girth from {stations} stations, with the slope of the sides',
  'measure-stretches': 'Whole stretches of {stretch_mm}, {rest_mm} left over',
  'measure-given': 'Given: {note}',
  'measure-uncertainty': 'May be off either way by',
  'measure-developed': 'Developed surface of one',

  // From the developed surface to a zone's net area
  'measure-openings': 'Less {count, plural, one {# opening} other {# openings}}',
  'measure-zone-share': 'This zone’s share',
  'measure-zone-parts': 'Share of the chosen parts, {girth_mm} of the girth',
  'measure-pierced-whole': 'Pierced: openings are not taken off',
  'measure-members': 'Alike',
  'measure-plan-area': 'Plan area of the zone',
  'measure-relief':
    'True surface of {relief, select, flat {flat work} low {low relief} middle {middle relief} high {high relief} pierced {pierced work} other {work in the round}} over its plan',
  'measure-net': 'True surface of the zone',

  // What a member's areas have to tell
  'measure-openings-too-large':
    'The openings take {openings_mm2}, more than the {area_mm2} there is. Make them smaller, or fewer.',
  'measure-opening-too-long':
    'This opening reaches {opening_mm} from end to end, corner to corner, and the face only {face_mm}.',
  'measure-opening-too-wide': 'This opening is {opening_mm} across where it is narrowest, and the face only {room_mm}.',
  'measure-shares-over': 'The zones of this member take {taken_percent} together. They can take 100% at most.',
  'measure-parts-none': 'This zone takes parts of the girth, but none is chosen. Choose parts, or give it a share.',
  'measure-part-unknown': 'This zone takes a part of the girth that the profile no longer has.',
  'measure-part-twice': 'Two zones take the same part of the girth.',
  'measure-bare': '{bare_mm2} of this member is in no zone and stays bare.',
  'measure-pierced-openings':
    'Pierced work counts whole: the openings are not taken off it, their edges are in the factor.',

  // Shapes that cannot be
  'shape-ring-inside-out': 'The inner diameter must be smaller than the outer one.',
  'shape-crosses-itself': 'The outline crosses or touches itself. Put the corners in order, round the edge.',
  'shape-element-twice': 'Two elements of this profile bear the same mark.',
  'shape-scotia-too-deep': 'A scotia projects at most as far as it is high, here {height_mm}.',
  'shape-arc-too-bowed': 'This arc rises too far for its ends: at most {limit_mm}.',
  'shape-returns-many': 'There are more returns than ends: {limit} at most.',
  'shape-turns-count':
    'This plan needs {needed, plural, =0 {no mitre angle} one {# mitre angle} other {# mitre angles}}.',
  'shape-turns-sum': 'A plan that closes turns through 360° in all; these mitres turn through {sum}°.',
  'shape-sides-cannot-close':
    'The side of {longest_mm} is too long to close this plan: the others come to {others_mm} together.',
  'shape-plan-gap':
    'With these turns the last side ends {gap_mm} away from where the first one begins. Measure again, or leave the plan open.',
  'shape-plan-too-tight':
    'The profile is too deep for this plan: a side or a curve would shrink to nothing. Check the lengths and the edge they were measured at.',
  'shape-turned-past-axis': 'The profile runs through the axis. Start from a larger radius, or step in less.',
  'shape-girths-even': 'Take an odd number of girths, equally spaced: first, last, and every one between.',
  'shape-stations-order': 'Each station must lie further along than the one before it.',
  'shape-lobes-too-deep': 'The hollows would meet in the middle: the depth is at most twice the mean radius.',
  'shape-core-too-wide': 'The core must be narrower than the ribbon that winds round it.',
  'shape-torus-too-thick': 'The section is too thick for this ring: it would close its own middle.',
  'shape-cut-away': 'More is cut off than the {height_mm} there is.',
  'shape-fluting-too-deep': 'For this width the cut is at most {limit_mm} deep.',

  // Measuring rules: quantities that are paid for, never areas
  'paid-plain': '{count, plural, =1 {} other {# × }}{length_mm} by {girth_mm}',
  'paid-carved-twice':
    '{count, plural, =1 {} other {# × }}{area_mm2} carved, paid twice over, {sides, plural, one {one side} other {both sides}}',
  'paid-girth-raised': '{count, plural, =1 {} other {# × }}{length_mm} by {girth_mm}, paid as {paid_mm}',
  'paid-weighted': '{count, plural, =1 {} other {# × }}{area_mm2} at its worth of {worth, number}',
  'paid-quantity': 'Quantity paid for',
} as const;
