import { v7 } from 'uuid';

/** A new id, made here so that a repeated PUT is harmless; ids sort by the time they were made (UUIDv7). */
export const newId = (): string => v7();
