/** One step of the schema: statements that may be repeated without harm, since MariaDB commits each on its own. */
export interface Migration {
  readonly name: string;
  readonly statements: readonly string[];
}

export const migration = (name: string, statements: readonly string[]): Migration => ({ name, statements });
