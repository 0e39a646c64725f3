import type { Config } from './config';

/** Where links in letters lead: the public address, or the machine itself. */
export const ownOrigin = ({ publicUrl, port }: Config): string => publicUrl?.origin ?? `http://127.0.0.1:${port}`;
