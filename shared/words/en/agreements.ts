export const agreements = {
  'access-ended': 'This link does not open anything any more. Please ask the workshop for a new one.',
  'access-day-past': 'The last day must not lie in the past.',
  'access-day-far': 'At most two years from today, please.',
  'access-no-email':
    'No e-mail address is kept for {client}, so nothing can be sent. Copy the link instead, or enter an address.',
  'visit-too-often': 'Too many links were tried from here. Please wait {seconds} seconds and try again.',
  'sign-in-letter-too-often':
    'Several letters were asked for already. Please look in your mail, or wait {seconds, plural, one {# second} other {# seconds}} and try again.',
  'question-too-often':
    'That was a lot at once. Please wait {seconds, plural, one {# second} other {# seconds}} before the next question.',
  'choice-one-of-group': 'Only one of “{group}” can be chosen.',
  'choice-fixed':
    'This issue was worked by an earlier reckoning, so it can be accepted only as it stands. Ask the workshop for a new issue if you would like an alternative.',
  'choice-not-possible': 'These alternatives do not go together. Please ask the workshop.',
  'decision-past-validity': 'This estimate held until {day}. Please ask the workshop for a new one.',
  'decision-replaced': 'A later issue has taken the place of this one. Please read that one instead.',
  'decision-made': 'This estimate has been {state, select, accepted {accepted} other {declined}} already.',
  'decision-another-accepted': 'Another issue of this estimate has been accepted already.',
  'decision-changed':
    'The price or the paper is not the one that was shown. Please look at it once more before accepting.',
  'variation-takes-too-much':
    'This takes away more than was agreed on the job, or under a tax nothing was agreed under. Take away no more than there is.',
  'variation-no-contract':
    'Nothing has been agreed on this job yet, so there is nothing to vary. Change the estimate instead.',
  'variation-other-currency': 'This job was agreed in {currency}, and the workshop works in another currency now.',
  'letter-placeholder-unknown': '“{name}” is not known here. What can stand in braces: {known}',
  'letter-placeholder-needed': 'Without {name} in braces this letter is of no use.',
  'letter-brace-alone': 'A brace stands alone here. Braces hold one of the names offered.',
  'history-access-given': 'Gave {name} a link to the papers of the job',
  'history-access-revoked': 'Took a link of {name} back',
  'history-access-opened': '{name} opened the papers of the job',
  'history-question-asked': '{name} asked about issue {letter} of estimate {number}',
  'history-question-answered': 'Answered {name} about issue {letter} of estimate {number}',
  'history-variation-begun': 'Variation {number} was begun',
  'history-letter-template-changed': 'Changed the words of a letter',
  'history-letter-template-reset': 'Went back to the usual words of a letter',
  'letter-estimate-subject': '{workshop}: estimate {number} for {job}',
  'letter-estimate-text':
    'Dear {client},\n\nour estimate {number} for {job} is ready to read. It comes to {total} and holds until {day}.\n\n{note}\n\nHere you can read it, choose among alternatives, ask about it and accept it:\n\n{link}\n\nThe link is meant for you alone.\n\nWith kind regards\n{workshop}\n',
  'letter-variation-subject': '{workshop}: variation {number} for {job}',
  'letter-variation-text':
    'Dear {client},\n\nfor {job} there is a change to agree on, variation {number}. It comes to {total} and holds until {day}.\n\n{note}\n\nHere you can read it, ask about it and accept it:\n\n{link}\n\nThe link is meant for you alone.\n\nWith kind regards\n{workshop}\n',
  'letter-answer-subject': '{workshop}: about {job}',
  'letter-answer-text':
    'Dear {client},\n\nabout {job}:\n\n{text}\n\nThe link you were sent before opens the papers and everything written so far. If it has ended, simply answer this letter.\n\nWith kind regards\n{workshop}\n',
  'letter-accepted-subject': '{workshop}: {number} is accepted',
  'letter-accepted-text':
    'Dear {client},\n\nthank you. You have accepted {number} for {job}, {total}. The paper you accepted is attached; please keep it.\n\nWith kind regards\n{workshop}\n',
  'letter-sign-in-subject': '{workshop}: your papers',
  'letter-sign-in-text':
    'Dear {client},\n\nsomebody, most likely you, asked for a way to your papers at {workshop}. This link opens them for an hour:\n\n{link}\n\nIf it was not you, nothing has to be done.\n\n{workshop}\n',
  'letter-total': '{total}{taxed, select, yes { with tax} other {}}',
  'letter-job-none': 'work done for you',
  'letter-invoice-subject': '{workshop}: invoice {number}',
  'letter-invoice-text':
    'Dear {client},\n\ninvoice {number} for {job} is attached. It comes to {total} and is due on {day}.\n\n{note}\n\nHere you can have a link to your papers sent to you, and pay by card where we take cards:\n\n{link}\n\nWith kind regards\n{workshop}\n',
  'letter-credit-note-subject': '{workshop}: credit note {number}',
  'letter-credit-note-text':
    'Dear {client},\n\ncredit note {number} for {job} is attached. It comes to {total}.\n\n{note}\n\nWith kind regards\n{workshop}\n',
  'letter-receipt-subject': '{workshop}: thank you for your payment',
  'letter-receipt-text':
    'Dear {client},\n\nwe have received {total} towards invoice {number} on {day}. What is still open of it: {open}.\n\nWith kind regards\n{workshop}\n',
  'letter-reminder-subject': '{workshop}: invoice {number} is still open',
  'letter-reminder-text':
    'Dear {client},\n\ninvoice {number} for {job} was due on {day}, and {open} of it is still open. If it has crossed with your payment, please take this as settled. The invoice is attached once more.\n\n{note}\n\nHere you can have a link to your papers sent to you, and pay by card where we take cards:\n\n{link}\n\nWith kind regards\n{workshop}\n',
  'letter-statement-subject': '{workshop}: what is open',
  'letter-statement-text':
    'Dear {client},\n\non {day}, {open} was open in all. The statement is attached.\n\n{note}\n\nWith kind regards\n{workshop}\n',
  'notice-question-subject': '{client} asks about {number}',
  'notice-question-text':
    '{client} writes about {number}, {job}:\n\n{text}\n\nAnswer in the job itself, so that it stands in the thread:\n\n{link}\n',
  'notice-accepted-subject': '{client} has accepted {number}',
  'notice-accepted-text':
    '{client} has accepted {number} for {job}, {total}, signed as {signed}. {chosen}\n\nThe accepted paper is attached.\n\n{link}\n',
  'notice-chosen': 'Alternatives chosen: {names}.',
  'notice-chosen-base': 'It is accepted as offered, without alternatives.',
  'notice-declined-subject': '{client} has declined {number}',
  'notice-declined-text': '{client} has declined {number} for {job}.\n\n{text}\n\n{link}\n',
  'example-client': 'Helena Marsh',
  'example-job': 'Console table for the long gallery',
  'example-note': 'The water-gilt feet are shown as an alternative.',
  'example-text': 'Yes, the top edge can be left plain.',
} as const;
