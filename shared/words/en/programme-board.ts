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
  'programme-lot-fewer-may': 'At least the {crew, plural, one {one} other {#}} it takes.',
  'programme-hands-beyond':
    'Work that takes several at once keeps helping hands busy for {hands_minutes}. The price counts hands-on time once: where help has to be paid for, enter it as a line of its own.',
  'programme-in-portions':
    '{step} ({lot}) and what follows it are planned in {portions, plural, one {# portion} other {# portions}}, so that each stays inside its time.',
  'programme-no-plan': 'There is no plan yet.',
  'programme-plan-broken': 'The plan breaks what the programme asks for. What it breaks is listed with it.',
  'programme-breaks-hours': '{task} stands where its people do not work, or where it cannot be done in one go.',
  'programme-breaks-start': '{task} starts before it may.',
  'programme-breaks-past': '{task} would begin in the past.',
  'programme-breaks-people': '{task} and {other} ask for the same hands at the same time.',
  'programme-breaks-place': '{task} finds no room: {place} is full then.',
  'programme-breaks-lag': '{task} starts before {before} lets it.',
  'programme-breaks-window': '{task} comes too late after {before}: the window has closed.',
  'programme-breaks-far': '{task} begins more than ten years after the programme does. Please plan it nearer.',
  'programme-breaks-missing': '{task} is not in the plan.',
  'programme-breaks-unknown':
    'The plan holds {tasks, plural, one {a task} other {# tasks}} that are not in the programme any more.',
  'programme-hold-not-sent': 'A slot is held for an issue that was sent. Mark the issue as sent first.',
  'programme-hold-over': 'The validity of issue {letter} ended on {until}: there is nothing to hold a slot for.',
  'programme-planning-enough':
    'Three programmes of the workshop are being planned already. Please ask again once one of them is done.',
  'programme-day-outside': 'Choose a day between 1971 and 2199.',
  'shop-days-too-long': 'This is more than a year. Change the usual hours instead, or enter it year by year.',
  'programme-day-far': 'Planning reaches five years back and six ahead. Please name a nearer day.',
  'programme-mark-future': 'This lies in the future.',
  'programme-mark-before-start': 'It cannot end before it was started.',
  'programme-mark-not-on-board': 'The job is not accepted, so nothing of it is worked yet.',
  'programme-assumes-people':
    'Assumed: {people, plural, one {one person} other {# people}} at work, {share_percent} of their hours productive.',
  'programme-assumes-air': 'Assumed: {temperature_celsius} and {humidity_percent} in the workshop throughout.',
  'programme-assumes-months': 'Assumed: the air of the workshop month by month.',
  'programme-assumes-estimate-air': 'Assumed: the air of the workshop as the estimate has it.',
  'programme-assumes-carving':
    'Assumed: {things, plural, one {the carving is} other {the carving of # members is}} approved within {days, plural, one {one working day} other {# working days}} of being ready.',
  'programme-assumes-sample':
    'Assumed: {things, plural, one {the sample board is} other {# sample boards are}} approved within {days, plural, one {one working day} other {# working days}} of the start.',
  'programme-assumes-top':
    'Assumed: the top is fitted dry within {days, plural, one {one working day} other {# working days}} of the carving.',
  'programme-assumes-in-hand':
    'Kept in hand before the day offered: {days, plural, one {one working day} other {# working days}}.',
  'programme-assumes-promised':
    'Planned around {jobs, plural, =0 {no other work} one {one other job} other {# other jobs}}.',
  'history-shop-changed': 'Changed hours, places and people of the workshop',
  'history-programme-changed': 'Changed the programme of estimate {number}',
  'history-plan-kept': 'Planned estimate {number}: {starts} to {finishes}',
  'history-slot-held': 'Held the slot of estimate {number} for issue {letter} until {until}',
  'history-slot-released': 'Gave the held slot of estimate {number} up',
  'history-task-started': '{name} started {task} of {lot}',
  'history-task-finished': '{name} finished {task} of {lot}',
  'history-tasks-as-planned':
    '{name} said of {tasks, plural, one {one task} other {# tasks}} that all went as planned: {task} of {lot}{tasks, plural, one {} other { and others}}',
  'history-task-unmarked': '{name} took back where {task} of {lot} stands',
  'history-feed-made': 'Made the calendar {name} for other programs',
  'history-feed-revoked': 'Took the calendar {name} back',
  'paper-programme': 'Programme',
  'paper-programme-dates':
    'Work starts on {starts} at the earliest and goes on until {finishes}; the workshop is open on {days, plural, one {one day} other {# days}} of that time. Offered for {offered}.',
  'paper-programme-piece': 'Piece',
  'paper-programme-work': 'Work',
  'paper-programme-from': 'From',
  'paper-programme-to': 'To',
  'paper-programme-carving': 'Carving: {member}',
  'sheet-programme': 'Programme',
  'sheet-programme-note':
    'Dates as they were planned when this was issued. They do not follow the figures of the other sheets.',
  'sheet-programme-whole': 'All of it',
  'sheet-programme-days': '{days, plural, one {One open day} other {# open days}} from start to finish',
  'sheet-programme-offered': 'Offered for',
  'feed-workshop': '{workshop}: the board',
  'feed-person': '{workshop}: {person}',
  'feed-task': '{job} · {piece}: {task}',
  'feed-coat': '{step}, coat {coat, number} of {coats, number}',
  'feed-portion': '{task}, portion {portion, number} of {portions, number}',
  'feed-carving': 'Carving of {member}',
  'feed-lot': 'Lot: {lot}',
} as const;
