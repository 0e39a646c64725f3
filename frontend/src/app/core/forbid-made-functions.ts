/** Where zod keeps its settings, whichever of the two comes first. */
interface ZodSettings {
  __zod_globalConfig?: { jitless?: boolean };
}

/** Tells zod to make no functions out of text, which the page's policy forbids; nothing of zod has to be there yet. */
export function forbidMadeFunctions(): void {
  const page = globalThis as ZodSettings;
  page.__zod_globalConfig ??= {};
  page.__zod_globalConfig.jitless = true;
}
