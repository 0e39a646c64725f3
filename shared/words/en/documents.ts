export const documents = {
  // The estimate as a client reads it
  'paper-estimate': 'Estimate',
  'paper-number-letter': '{number}, issue {letter}',
  'paper-estimate-title': 'Estimate {number}, issue {letter}',
  'paper-estimate-head': 'Estimate {number}, issue {letter}: {title}',
  'paper-estimate-subject': 'Estimate for {client}',
  'paper-page-of': 'Page {page} of {pages}',
  'paper-date': 'Date',
  'paper-holds-until': 'Holds until',
  'paper-job': 'Job',
  'paper-reference': 'Your reference',
  'paper-site': 'For',
  'paper-issued-by': 'From',
  'paper-telephone': 'Telephone {telephone}',
  'paper-tax-registration': 'Tax registration {number}',

  'paper-lines': 'What it comes to',
  'paper-column-work': 'Work',
  'paper-column-price': 'Price',
  'paper-general-lines': 'The job as a whole',
  'paper-member-count': '{count, plural, one {one} other {# of these}}',
  'paper-measured-work': '{quantity} {unit}, by the rule: {rule}',
  'paper-lines-sum': 'Sum of the lines',
  'paper-discount': 'Discount',
  'paper-discount-percent': 'Discount of {share_percent}',
  'paper-net': 'Net',
  'paper-tax': '{name}: {rate_percent} of {net_minor}',
  'paper-untaxed': '{name}, on {net_minor}',
  'paper-total': 'Total',

  'paper-alternatives': 'Other ways of doing it',
  'paper-alternatives-note':
    '{chosen, select, none {Each is counted by itself against the total above, tax included.} other {Each is counted by itself against the work without any of them, tax included. Those the total above already holds are marked.}}',
  'paper-column-alternative': 'Instead',
  'paper-column-total': 'Total with it',
  'paper-column-difference': 'Difference',
  'paper-one-of': '{group}: one of these',
  'paper-alternative-chosen': '{name} (in the total above)',
  'paper-more': '+ {amount}',
  'paper-less': '− {amount}',
  'paper-no-difference': 'none',

  'paper-payment': 'Payment',
  'paper-column-stage': 'Stage',
  'paper-column-share': 'Share',
  'paper-column-worth': 'Worth',
  'paper-column-recovered': 'Deposit recovered',
  'paper-column-retained': 'Held back',
  'paper-column-paid': 'To pay',
  'paper-stage-deposit': 'Deposit, on acceptance',
  'paper-stage-whole': 'The whole, when it is finished',
  'paper-stage-first-release': 'First half of what is held back, on completion',
  'paper-stage-second-release': 'Second half, once defects have been made good',
  'paper-payment-note':
    'Tax is included. The deposit is recovered from each stage in proportion to the work it pays for.',

  'paper-time': 'Time',
  'paper-time-weeks':
    'About {weeks, plural, one {one week} other {# weeks}} from the start of work until it is ready, drying and approvals included.',
  'paper-time-carving': 'Carving goes on for about {weeks, plural, one {one week} other {# weeks}} of that.',
  'paper-time-drying':
    'Size, gesso, bole, leaf and finishes dry at their own pace; the time is counted for workshop air of {temperature_celsius} and {humidity_percent} relative humidity.',
  'paper-holding': 'How long this holds',
  'paper-holds': 'This estimate holds until {day}.',
  'paper-leaf-holds':
    'Prices of leaf hold until {day}. Leaf ordered later is charged at the price of its day; nothing else changes.',
  'paper-included': 'Included',
  'paper-excluded': 'Not included',

  'paper-drawings': 'Drawings',
  'paper-drawings-note':
    'Each is drawn to the scale beside its name and measured over the wood, before ground and leaf.',
  'paper-view': '{view, select, face {face} profile {section} plan {plan} elevation {elevation} other {unrolled}}',
  'paper-view-scale':
    '{view, select, face {face} profile {section} plan {plan} elevation {elevation} other {unrolled}}, {scale}',
  'paper-buildups': 'How the surfaces are built up',
  'paper-buildups-note':
    'From the wood at the bottom to the finish on top, with the number of coats. The layers are drawn thick enough to see, not to scale.',
  'paper-layer-wood': 'Wood',
  'paper-coats': '{fewest} to {most}',
  'paper-zones-more': '{names} and {more} more',

  'paper-care': 'Care',
  'care-water-gilding':
    'Water gilding is tender. Dust it with a soft dry brush only: never damp, never with a cloth, never with a cleaner.',
  'care-oil-gilding': 'Oil gilding is firmer, yet wears by rubbing. Dust it with a soft dry brush.',
  'care-painted': 'Painted and glazed surfaces are dusted dry. Ask us before anything else is tried on them.',
  'care-sealed-metal':
    'Silver, composition and aluminium leaf lie under a seal that keeps the air off them. Where it is scratched or cleaned away they darken.',
  'care-room':
    'Keep the piece out of the sun and away from radiators, fires and damp walls, in air that stays much the same the year round.',
  'care-outdoors':
    'Outdoors and in damp places gilding weathers. Have it looked over once a year, so that small breaks stay small.',
  'care-handling': 'Lift it by the frame, never by carved or gilded parts, with clean dry hands or cotton gloves.',
  'care-damage': 'Keep what comes off, however small, and let us put it back.',

  'paper-cautions': 'Please note',
  'client-top-on-base':
    'A heavy or loose top on a carved or narrow base has to be checked by a structural engineer before it is set on it.',
  'client-old-coatings':
    'Old coatings may hold lead. They are tested before anything is sanded, scraped or heated; what the test asks for is not in this estimate unless it says so.',
  'paper-terms': 'Terms',
  'paper-acceptance': 'Acceptance',
  'paper-acceptance-text': 'We accept estimate {number}, issue {letter}, at a total of {total}.',
  'paper-acceptance-place': 'Place and date',
  'paper-acceptance-name': 'Name and signature',
} as const;
