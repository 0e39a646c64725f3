import { randomBytes } from 'node:crypto';

/** 256 bits by chance (OWASP asks for 64, ASVS 7.2.3 for 128). */
export const newSessionId = (): string => randomBytes(32).toString('base64url');
