import { parentPort } from 'node:worker_threads';
import { cardAnswer, type CardQuestion } from './workbook/card-answer';

/** Reads workbooks away from the thread that answers requests. */
parentPort?.on('message', (question: CardQuestion) => {
  cardAnswer(question).then(
    (answer) => parentPort?.postMessage({ answer }),
    (error: unknown) => parentPort?.postMessage({ error: String((error as Error).stack ?? error) }),
  );
});
