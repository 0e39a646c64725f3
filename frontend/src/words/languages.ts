import type { Catalogue } from '#shared/words/word-code';

/** One language of the screens: the words of `shared/words`, and those of the templates where they are not English. */
export interface Language {
  readonly catalogue: () => Promise<Catalogue>;
  /** By the ids of the messages, as `loadTranslations` takes them. */
  readonly templates?: () => Promise<Readonly<Record<string, string>>>;
}

/** Every language there are words for; a further one is a file in `shared/words`, a file here, and a line. */
export const languages: Readonly<Record<string, Language>> = {
  en: { catalogue: () => import('#shared/words/en').then(({ en }) => en) },
};

/** The first of a person's languages that there are words for, else English. */
export const languageFor = (preferred: readonly string[]): string =>
  preferred.map((tag) => tag.split('-')[0]).find((language) => Object.hasOwn(languages, language)) ?? 'en';
