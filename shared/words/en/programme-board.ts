export const programmeBoard = {
  'shop-hours-end-before-start': 'Hours end after they begin.',
  'shop-hours-overlap': 'These hours overlap those before them.',
  'shop-days-end-before-start': 'The last day lies before the first.',
  'shop-climates-none-or-year': 'Enter the air of all twelve months, or of none.',
  'shop-grade-unknown': 'The rate card in force has no such grade.',
  'shop-membership-unknown': 'Choose somebody who works here.',
  'shop-membership-twice': 'This sign-in belongs to somebody else in the list.',
  'programme-lot-unknown': 'There is no such lot in this estimate any more.',
  'programme-task-unknown': 'There is no such task in this programme any more.',
  'programme-no-hand':
    'Nobody here does the work of {grade}: {hands_minutes} of it cannot be planned. Give somebody that grade, or enter somebody who has it.',
  'programme-crew-short':
    '{task} takes {crew, plural, one {one person} other {# people}} of {grade} at once, and there {people, plural, =0 {is nobody} one {is one} other {are #}}.',
  'programme-place-short':
    '{lot} takes {amount, plural, one {one place} other {# places}} of {place}, and there {capacity, plural, one {is one} other {are #}}.',
  'programme-not-dry':
    'In the air of {day} nothing of {lot} would dry, so the lot cannot be planned: {temperature_celsius} and {humidity_percent}.',
  'programme-in-portions':
    '{step} and what follows it are planned in {portions, plural, one {# portion} other {# portions}}, so that each stays inside its time.',
  'programme-no-plan': 'There is no plan yet.',
  'programme-plan-none': 'This is no plan: nothing in it says when it ends.',
  'programme-plan-broken': 'The plan breaks what the programme asks for. What it breaks is listed with it.',
  'programme-plan-outdated': 'Something the plan rests on has changed since: plan anew.',
  'programme-hold-not-sent': 'A slot is held for an issue that was sent. Mark the issue as sent first.',
  'programme-hold-over': 'The validity of issue {letter} ended on {until}: there is nothing to hold a slot for.',
  'programme-mark-future': 'This lies in the future.',
  'programme-mark-before-start': 'It cannot end before it was started.',
  'programme-mark-not-planned': 'There is no plan of this task to be worked from yet.',
  'programme-mark-not-on-board': 'The job is not accepted, so nothing of it is worked yet.',
  'programme-assumes-people':
    'Assumed: {people, plural, one {one person} other {# people}} at work, {share_percent} of their hours productive.',
  'programme-assumes-air': 'Assumed: {temperature_celsius} and {humidity_percent} in the workshop throughout.',
  'programme-assumes-months': 'Assumed: the air of the workshop month by month.',
  'programme-assumes-estimate-air': 'Assumed: the air of the workshop as the estimate has it.',
  'programme-assumes-carving':
    'Assumed: the carving of {name} is approved within {days, plural, one {one working day} other {# working days}}.',
  'programme-assumes-sample':
    'Assumed: the sample board for {name} is approved within {days, plural, one {one working day} other {# working days}} of the start.',
  'programme-assumes-top':
    'Assumed: the top is fitted dry to {name} within {days, plural, one {one working day} other {# working days}}.',
  'programme-assumes-in-hand':
    'Kept in hand before the day offered: {days, plural, one {one working day} other {# working days}}.',
  'programme-assumes-promised':
    'Planned around {jobs, plural, =0 {no other work} one {one other job} other {# other jobs}}.',
  'what-if-set-up': 'Further hands: {days, plural, one {one day} other {# days}} set up at {hours_hours} each.',
  'history-shop-changed': 'Changed hours, places and people of the workshop',
  'history-programme-changed': 'Changed the programme of estimate {number}',
  'history-plan-kept': 'Planned estimate {number}: {starts} to {finishes}',
  'history-slot-held': 'Held the slot of estimate {number} for issue {letter} until {until}',
  'history-slot-released': 'Gave the held slot of estimate {number} up',
  'history-task-started': '{name} started {task} of {lot}',
  'history-task-finished': '{name} finished {task} of {lot}',
  'history-task-unmarked': '{name} took back where {task} of {lot} stands',
  'history-feed-made': 'Made the calendar {name} for other programs',
  'history-feed-revoked': 'Took the calendar {name} back',
  'feed-workshop': '{workshop}: the board',
  'feed-person': '{workshop}: {person}',
  'feed-task': '{job} · {piece}: {task}',
  'feed-coat': '{step}, coat {coat, number} of {coats, number}',
  'feed-portion': '{task}, portion {portion, number} of {portions, number}',
  'feed-carving': 'Carving of {member}',
  'feed-lot': 'Lot: {lot}',
  'feed-window': 'Has to be kept by {at}',
  'feed-dry': 'Dry by {at}',
} as const;
