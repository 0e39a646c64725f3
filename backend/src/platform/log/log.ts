import pino, { type DestinationStream, type Logger } from 'pino';

export type Log = Logger;

/** Names whose values never reach the log, wherever they stand in what is logged. */
const secrets = ['password', 'current', 'token', 'csrf', 'cookie', 'authorization', 'secret'];

/** The driver adds the statement and its values to what went wrong; they may be secret, and stay out. */
const withoutStatement = (text: string | undefined): string =>
  (text ?? '').replace(/\nsql: [\s\S]*?(?=\n {4}at |$)/g, '');

/** Of an error only what it says and where it arose; never the values it happened with. */
function errorFacts(error: unknown): object {
  if (!(error instanceof Error)) return { message: String(error) };
  const { code, errno } = error as { code?: string; errno?: number };
  return {
    kind: error.name,
    message: withoutStatement(error.message),
    code,
    errno,
    stack: withoutStatement(error.stack),
  };
}

/** One JSON line per event, in UTC; JSON escapes CR and LF, so no text from outside can begin a line of its own. */
export const openLog = (level: string, destination: DestinationStream): Log =>
  pino(
    {
      level,
      base: null,
      serializers: { error: errorFacts },
      timestamp: pino.stdTimeFunctions.isoTime,
      redact: { paths: secrets.flatMap((name) => [name, `*.${name}`, `*.*.${name}`]), censor: '[kept out]' },
    },
    destination,
  );

/** A file, or else standard output. */
export const logDestination = (file: string | undefined): DestinationStream =>
  pino.destination({ dest: file ?? 1, mkdir: true, sync: true, mode: 0o600 });
