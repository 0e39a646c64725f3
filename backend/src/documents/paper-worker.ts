import { parentPort } from 'node:worker_threads';
import { benchSheet } from './bench-sheet/bench-sheet';
import { issuePaper, issuePapers } from './issue-papers';
import type { PaperQuestion } from './paper-making';

async function made(question: PaperQuestion) {
  if (question.kind === 'bench-sheet') return benchSheet(question.request);
  const logo = question.logo && Buffer.from(question.logo);
  if (question.kind === 'paper') return issuePaper(question.snapshot, logo, question.paper);
  return issuePapers(question.snapshot, logo);
}

/** Sets papers and writes workbooks away from the thread that answers requests. */
parentPort?.on('message', (question: PaperQuestion) => {
  made(question).then(
    (answer) => parentPort?.postMessage({ answer }),
    (error: unknown) => parentPort?.postMessage({ error: String((error as Error).stack ?? error) }),
  );
});
