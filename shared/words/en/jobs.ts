export const jobs = {
  'client-has-jobs': '{name} has {jobs, plural, one {a job} other {# jobs}} here, so the entry stays.',
  'client-unknown': 'Choose a client from the list.',
  'job-has-issues': 'An estimate of this job has been issued, so the job stays.',
  'audit-client-made': '{name} was entered as a client',
  'audit-client-changed': 'The client {name} was changed',
  'audit-client-removed': 'The client {name} was removed',
  'audit-job-made': 'The job {number} was opened',
  'audit-job-changed': 'The job’s particulars were changed',
  'audit-job-state': 'The job went from {before} to {after}',
  'audit-job-removed': 'The job {number} was removed',
} as const;
