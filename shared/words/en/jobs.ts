export const jobs = {
  'client-has-jobs': '{name} has {jobs, plural, one {a job} other {# jobs}} here, so the entry stays.',
  'client-unknown': 'Choose a client from the list.',
  'job-has-issues': 'An estimate of this job has been issued, so the job stays.',
  'history-client-entered': 'Entered {name} as a client.',
  'history-client-changed': 'Changed the client {name}.',
  'history-client-removed': 'Removed the client {name}.',
  'history-job-opened': 'Opened job {number}, {title}.',
  'history-job-changed': 'Changed what is known of job {number}.',
  'history-job-state':
    'Job {number} is {state, select, open {open} sent {with the client} accepted {accepted} declined {declined} other {finished}} now.',
  'history-job-removed': 'Removed job {number}, {title}.',
} as const;
