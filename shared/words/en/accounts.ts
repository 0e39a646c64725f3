export const accounts = {
  'sign-in-refused': 'E-mail address and password do not fit together.',
  'sign-in-too-often':
    'Too many attempts. Please wait {seconds, plural, one {# second} other {# seconds}} and try again.',
  'password-wrong': 'This is not your current password.',
  'password-common': 'This password is among the first that are tried. A few unrelated words of your own are safer.',
  'password-about-you': 'A password must not hold the name of the workshop, the product, or your own name or address.',
  'last-owner': 'A workshop needs an owner. Make somebody else an owner first.',
  'already-member': 'This person already belongs to the workshop.',
  'roles-none': 'Choose at least one role.',
  'picture-not-readable': 'Only pictures in PNG, JPEG or WebP can be used here.',
  'picture-too-many-pixels': 'This picture is larger than {megapixels} megapixels. Please scale it down first.',
  'file-name-not-fitting': 'The ending of the file’s name does not fit what is in it.',
  'upload-missing': 'Please choose a file.',

  'mail-reset-subject': 'A new password',
  'mail-reset-text':
    'Dear {name},\n\nsomebody, we hope you, asked for a new password. Open this within ten minutes to choose one:\n\n{link}\n\nIf it was not you, nothing needs doing: your password stays as it is.\n',
  'mail-foundation-subject': 'Found {workshop}',
  'mail-foundation-text':
    'Dear {name},\n\nopen this within an hour to choose a password and found {workshop}:\n\n{link}\n\nIf you did not ask for it, nothing needs doing.\n',
  'mail-foundation-known-text':
    'Dear {name},\n\nyou already have an account under this address. Open this within an hour and enter your password to found {workshop} beside the workshops you belong to:\n\n{link}\n\nIf you did not ask for it, nothing needs doing.\n',
  'mail-invitation-subject': 'You are invited to {workshop}',
  'mail-invitation-text':
    'Dear {name},\n\n{by} invites you to work with {workshop}. Open this within three days to join:\n\n{link}\n\nIf you do not know what this is about, nothing needs doing.\n',

  'history-workshop-founded': 'Founded the workshop.',
  'history-workshop-changed': 'Changed the settings of the workshop.',
  'history-logo-changed': 'Changed the picture of the letterhead.',
  'history-logo-removed': 'Took the picture off the letterhead.',
  'history-person-invited': 'Invited {name}.',
  'history-invitation-withdrawn': 'Took back the invitation of {name}.',
  'history-person-joined': '{name} joined.',
  'history-roles-changed': 'Changed what {name} does here.',
  'history-access-ended': 'Ended the access of {name}.',
  'history-access-restored': 'Restored the access of {name}.',
} as const;
