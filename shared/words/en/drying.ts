export const drying = {
  'drying-factor-water':
    'Drying in water at {temperature_celsius} and {humidity_percent}: {factor, number} times as long as at 20\u00a0°C (68\u00a0°F) and 50\u00a0%, by how much moisture the air can still take up.',
  'drying-factor-oil':
    'Drying of oil at {temperature_celsius} and {humidity_percent}: {warmth, number} for the warmth × {damp, number} for the damp.',
  'drying-factor-spirit': 'Spirit goes off at its own pace: shop air is not counted.',
  'drying-factor-clipped':
    'Reckoned at {unclipped, number}, held at {factor, number}: so far from ordinary air nothing is known. Try a sample.',
  'drying-too-damp':
    'At {humidity_percent} relative humidity nothing dries soundly. Dry the air below 95\u00a0% first.',
  'drying-too-cold':
    'At {temperature_celsius} nothing made with water sets soundly. Warm the room to 5\u00a0°C (41\u00a0°F) at least.',
  'drying-moisture':
    'At {temperature_celsius} and {humidity_percent} wood comes to rest at {moisture_percent} moisture.',
  'drying-movement': '{width_mm} wide × {coefficient, number, ::.00000} × {points, number} points of moisture.',
  'drying-moisture-apart':
    'Wood settles at {shop_percent} moisture in the shop and at {site_percent} on site, more than {limit, number} points apart. Let the piece settle, or have the air of the place looked after.',
  'drying-joint-moves':
    'A joint {width_mm} wide will move {movement_mm} between shop and site, more than {limit_mm}: gesso over it will crack. Bridge it with linen, or leave the joint free.',
  'drying-window':
    '{step}: the next step may start after {opens_minutes}{closes, select, none {} other { and up to {closes_minutes}}}, at a factor of {factor, number}.',
  'drying-portions':
    '{step} and what follows it are done in {portions, plural, one {# portion} other {# portions}}, so that each stays inside its time.',
  'drying-no-window':
    'In this working week no start was found for {step} that keeps all that follows inside its time; the plan goes over it.',
  'drying-missed-revive-or-relay':
    'If the time for burnishing is missed: revive the bole with damp breath or a damp cloth, or lay that part again.',
  'drying-missed-new-size': 'If the size has passed its tack: leave it to harden, rub down lightly and size again.',
  'drying-missed-key-and-recoat': 'If the coat has grown too hard: key it with fine abrasive before the next.',
  'drying-missed-strip-ground':
    'If gesso has stood too long between coats: damp it evenly before the next, and strip and begin again if it flakes.',
  'drying-missed-tarnished':
    'If silver has stood unsealed too long it tarnishes: clean what can be cleaned, lay the rest again, then seal.',
  'drying-hold-carving-approved':
    '{step} waits until the carving is approved, usually {days, plural, one {# working day} other {# working days}}.',
  'drying-hold-sample-approved':
    '{step} waits until the sample board is approved, usually {days, plural, one {# working day} other {# working days}} from the start.',
  'drying-hold-top-dry-fitted':
    '{step} waits until the top has been fitted dry, usually {days, plural, one {# working day} other {# working days}}.',
} as const;
