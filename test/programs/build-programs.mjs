import { buildServer, threads } from '../../backend/bin/build-server.mjs';

/** Processes that tests start in order to kill them. */
const doomed = {
  'mail-until-killed': 'backend/src/platform/mail/mail-until-killed.ts',
  'work-until-killed': 'backend/src/platform/tasks/work-until-killed.ts',
  'serve-until-committed': 'test/api/serve-until-committed.ts',
};

/** Puts together what tests start as threads and processes, once for a whole run: from the sources each start would take seconds. */
export const buildPrograms = () =>
  buildServer({ entryPoints: { ...threads, ...doomed }, outdir: '.cache/programs', sourcemap: 'inline' });
