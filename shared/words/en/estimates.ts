export const estimates = {
  'zone-shares-over': 'The shares of this member come to more than 100%.',
  'zone-leaf-missing': 'Choose the leaf that is laid on {zone}.',
  'stages-withhold-too-much': 'Deposit and retention together cannot be more than the contract.',
  'estimate-too-large':
    'Together these figures become too large to be worked out. Look at the counts and sizes that were changed last.',
  'effect-too-large': 'On the new card the figures of this estimate become too large to be worked out.',
  'stages-not-whole': 'The stages must come to 100% together.',
  'piece-unknown': 'Choose a piece of this estimate.',
  'piece-has-members': '{piece} still has members; move or remove them first.',
  'issue-draft-changed': 'The estimate was changed since you last saw it. Look at it once more before issuing.',
  'issue-card-old':
    'This estimate is worked on a rate card that is no longer in force. Take the new card, or say that the old one is meant.',
  'issue-refused': 'The estimate cannot be issued as it stands. What stops it is listed with it.',
  'issue-empty': 'There is nothing in this estimate yet.',
  'issue-below-nothing': 'An estimate cannot take more away than it offers. Only a variation of what was agreed may.',
  'issue-replaced': 'Issue {letter} was replaced by a later one.',
  'issue-decided': 'Issue {letter} was {state} already.',
  'issue-day-early': 'The day lies before the day of issue.',
  'issue-day-late': 'The day lies in the future.',
  'measuring-rule-plain-area': 'as measured, length by girth',
  'measuring-rule-carved-each-side': 'carved work counted double, each side',
  'measuring-rule-narrow-girth': 'narrow members at a girth of 6 or 12 inches',
  'measuring-rule-weighted': '{worth} times plain work',
  'measuring-rule-weighted-each': 'special work, each at so many times plain',
  'paid-quantity-differs': 'The quantity is not what its measures come to.',
  'alternative-empty':
    'The alternative “{name}” has nothing in it and leaves nothing out. It stays off the papers until it says what is done otherwise.',
  'alternatives-overlap':
    'The alternatives “{first}” and “{second}” may be chosen together, and both take the place of “{part}”. Put them in one group, so that the client takes one or the other.',
  'card-start-prices':
    'The rate card still has the {of, select, hours {rates of hours} other {prices of leaf}} every workshop starts from, which were meant in {start}, and here they are taken as {currency}. Enter your own and put the card in force.',
  'card-other-currency':
    'The {of, select, hours {rates of hours} other {prices of leaf}} of the rate card were entered in {start}, and here they are taken as {currency}. Enter them anew in a copy of the card and put it in force.',
  'currency-issued':
    'Estimates have been issued in the currency there is, and what is issued never changes. For another currency, found another workshop.',
  'history-estimate-currency':
    'Estimate {number} was carried over to {currency} with the workshop; its prices stayed the numbers they were',
  'history-estimate-begun': 'Estimate {number} was begun',
  'history-member-made': '{name} was entered',
  'history-member-changed': '{name} was changed',
  'history-member-removed': '{name} was removed',
  'history-piece-made': 'The piece {name} was entered',
  'history-piece-changed': 'The piece {name} was changed',
  'history-piece-removed': 'The piece {name} was removed',
  'history-settings-changed': 'Particulars of estimate {name} were changed',
  'history-card-taken': 'Estimate {number} was put on the rate card {card}',
  'history-issued': 'Issue {letter} of estimate {number} was made',
  'history-issue-sent': 'Issue {letter} of estimate {number} was sent',
  'history-issue-accepted': 'Issue {letter} of estimate {number} was accepted',
  'history-issue-accepted-with': 'Issue {letter} of estimate {number} was accepted with {chosen}',
  'history-issue-declined': 'Issue {letter} of estimate {number} was declined',
} as const;
