import pino, { type DestinationStream, type Logger } from 'pino';

export type Log = Logger;

/** Names whose values never reach the log, wherever they stand in what is logged. */
const secrets = ['password', 'current', 'token', 'csrf', 'cookie', 'authorization', 'secret'];

/** One JSON line per event, in UTC; JSON escapes CR and LF, so no text from outside can begin a line of its own. */
export const openLog = (level: string, destination: DestinationStream): Log =>
  pino(
    {
      level,
      base: null,
      timestamp: pino.stdTimeFunctions.isoTime,
      redact: { paths: secrets.flatMap((name) => [name, `*.${name}`, `*.*.${name}`]), censor: '[kept out]' },
    },
    destination,
  );

/** A file, or else standard output. */
export const logDestination = (file: string | undefined): DestinationStream =>
  pino.destination({ dest: file ?? 1, mkdir: true, sync: true, mode: 0o600 });
