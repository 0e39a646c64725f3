export const programmePlan = {
  'programme-waits-dry': 'Waiting for {task} until {until}{sameDay, select, yes {} other { on {day}}}.',
  'programme-waits-task': 'Waiting for {task} to be done, at {until}{sameDay, select, yes {} other { on {day}}}.',
  'programme-waits-approval':
    'Waiting for an approval, {approval}, until {until}{sameDay, select, yes {} other { on {day}}}.',
  'programme-waits-release': 'Not to be begun before {until}{sameDay, select, yes {} other { on {day}}}.',
  'programme-waits-pinned': 'Pinned to {until}{sameDay, select, yes {} other { on {day}}}.',
  'programme-waits-people': 'Hands are at {task} until {until}{sameDay, select, yes {} other { on {day}}}.',
  'programme-waits-place': 'Waiting for room, {place}, until {until}{sameDay, select, yes {} other { on {day}}}.',
  'programme-waits-hours': 'Waiting for working hours at {until}{sameDay, select, yes {} other { on {day}}}.',
  'programme-waits-window':
    'Put off to {until}{sameDay, select, yes {} other { on {day}}}, so that {task} falls inside its time.',
  'programme-contradiction':
    'These steps contradict each other whatever the hours: {tasks}. Together they ask for {over_minutes} more than they allow.',
  'programme-no-time':
    'No time to begin {task} was found at which {next} keeps its time and falls into working hours too.',
  'programme-no-hours':
    'No hours were found in which {task} can be done{isBreakable, select, yes {} other { on one day}}.',
  'programme-too-few': 'Nobody, or too few, can do {task}.',
  'programme-impossible': 'With the people and places there are, these lags cannot all be kept.',
  'programme-pin-closed': '{task} is pinned to a time at which nobody can begin it.',
  'programme-pin-passed':
    '{task} was pinned to a time that is over, and nobody has marked it as begun: it is planned anew.',
  'programme-pin-clash': '{task} is pinned too early for what has to come before it.',
  'programme-window-missed':
    'The time of {task} is over before {next} can be done. See what the trade does when it was missed, and have somebody look at it.',
  'programme-too-late': 'This cannot be done by then: begun at once it is done {late_minutes} later.',
  'programme-only-early':
    'This is the plan that begins as early as it may: none was found that begins later and is still done by then.',
  'programme-remedy-other-size': 'With {size} instead.',
  'programme-remedy-portions':
    'With {task} and what is tied to it in {portions, plural, one {# portion} other {# portions}}.',
  'programme-remedy-longer-day': 'With a day that is {by_minutes} longer.',
  'programme-remedy-further-hands': 'With one more of {grade}.',
} as const;
