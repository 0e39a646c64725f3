import { literal, type WhereOptions } from 'sequelize';
import { column } from './columns';
import type { Database, Table } from './database';
import { searchableWords } from './searchable-words';

interface WordRow {
  readonly workshopId: string;
  readonly kind: string;
  readonly word: string;
  readonly subjectId: string;
}

/** Something that can be found by its words. */
export interface Subject {
  readonly id: string;
  readonly text: string;
}

/** What a search leaves of a list: the few subjects its words lead to, or words so common that each row is asked for them. */
export interface Narrowing {
  readonly few: readonly string[] | undefined;
  readonly common: readonly string[];
  /** More subjects match than are ever counted. */
  readonly isBeyondCounting: boolean;
}

/** A word that more subjects have is common: they are met soon enough while the list is read in its order. */
const fewAtMost = 1_000;
const askedAtMost = 6;
const joinedAtMost = 3;
const writtenAtOnce = 200;

/** Words that begin another asked word ask for nothing more; beyond six the shortest are left out. */
function askedWords(text: string): string[] {
  const words = searchableWords(text);
  const telling = words.filter((word) => !words.some((other) => other !== word && other.startsWith(word)));
  return telling.sort((one, other) => other.length - one.length).slice(0, askedAtMost);
}

/** For a table whose rows are the subjects: the words of a row are looked through once, and each that is begun sets its bit. */
const hasCommonWords = literal(
  `(SELECT BIT_OR(IF(s.word LIKE :word1, 1, 0) | IF(s.word LIKE :word2, 2, 0) | IF(s.word LIKE :word3, 4, 0)
     | IF(s.word LIKE :word4, 8, 0) | IF(s.word LIKE :word5, 16, 0) | IF(s.word LIKE :word6, 32, 0))
    FROM search_words s WHERE s.workshop_id = :workshopId AND s.kind = :kind AND s.subject_id = id) = :allBits`,
);

/** Joined so that the database begins with whichever beginning it estimates to be the rarest. */
const subjectsWithThree = `SELECT DISTINCT a.subject_id AS id FROM search_words a
  JOIN search_words b ON b.workshop_id = a.workshop_id AND b.kind = a.kind AND b.subject_id = a.subject_id
  JOIN search_words c ON c.workshop_id = a.workshop_id AND c.kind = a.kind AND c.subject_id = a.subject_id
  WHERE a.workshop_id = :workshopId AND a.kind = :kind AND a.word LIKE :first AND b.word LIKE :second AND c.word LIKE :third
  LIMIT :limit`;

const subjectsWithOne = `SELECT DISTINCT subject_id AS id FROM search_words
  WHERE workshop_id = :workshopId AND kind = :kind AND word LIKE :first LIMIT :limit`;

const subjectsCounted = `SELECT COUNT(*) AS subjects FROM (${subjectsWithOne}) found`;

const pattern = (beginning: string): string => `${beginning}%`;

/** The words by which rows of one kind are found, each by its beginning. */
export class SearchWords {
  private readonly table: Table<WordRow>;

  constructor(
    private readonly database: Database,
    private readonly kind: string,
  ) {
    this.table = database.table<WordRow>('search_words', {
      workshopId: column.workshopId,
      kind: column.id,
      word: column.id,
      subjectId: column.id,
    });
  }

  /** Writes the words of some subjects anew. */
  async write(workshopId: string, subjects: readonly Subject[]): Promise<void> {
    for (let at = 0; at < subjects.length; at += writtenAtOnce)
      await this.writeSome(workshopId, subjects.slice(at, at + writtenAtOnce));
  }

  async remove(workshopId: string, ids: readonly string[]): Promise<void> {
    await this.table.destroy({ where: { workshopId, kind: this.kind, subjectId: [...ids] } });
  }

  /** What a search leaves of the list; every word of it must begin a word of the subject. */
  async narrow(workshopId: string, search: string): Promise<Narrowing> {
    const words = askedWords(search);
    if (words.length === 0) return narrowing(search.trim() === '' ? undefined : [], []);
    const rare: string[][] = [];
    const common: string[] = [];
    for (const word of words) {
      if (await this.isCommon(workshopId, word)) common.push(word);
      else rare.push(await this.subjectsWith(workshopId, [word]));
    }
    if (rare.length > 0) return narrowing(inEvery(rare), common);
    if (common.length === 1) return narrowing(undefined, common);
    const together = await this.subjectsWith(workshopId, common);
    return together.length > fewAtMost ? narrowing(undefined, common) : narrowing(together, common.slice(joinedAtMost));
  }

  /** The condition on rows that a narrowing amounts to, and the values it names. */
  condition(
    workshopId: string,
    { few, common }: Narrowing,
  ): { where: WhereOptions[]; values: Record<string, unknown> } {
    const patterns = Array.from({ length: askedAtMost }, (_, index): [string, string] => {
      const word = common[index];
      return [`word${index + 1}`, word === undefined ? '' : pattern(word)];
    });
    return {
      where: [...(few ? [{ id: [...few] }] : []), ...(common.length > 0 ? [hasCommonWords] : [])],
      values: { workshopId, kind: this.kind, allBits: 2 ** common.length - 1, ...Object.fromEntries<string>(patterns) },
    };
  }

  private async writeSome(workshopId: string, subjects: readonly Subject[]): Promise<void> {
    await this.remove(
      workshopId,
      subjects.map(({ id }) => id),
    );
    const rows = subjects.flatMap(({ id, text }) =>
      searchableWords(text).map((word) => ({ workshopId, kind: this.kind, word, subjectId: id })),
    );
    await this.table.bulkCreate(rows);
  }

  /** Whether more than a few subjects have a word with this beginning; counted where they lie, so that no list of them travels. */
  private async isCommon(workshopId: string, beginning: string): Promise<boolean> {
    const values = { workshopId, kind: this.kind, first: pattern(beginning), limit: fewAtMost + 1 };
    const [counted] = await this.database.select<{ subjects: number }>(subjectsCounted, values);
    return (counted?.subjects ?? 0) > fewAtMost;
  }

  /** The subjects that have words with these beginnings, as far as there are few. */
  private async subjectsWith(workshopId: string, beginnings: readonly string[]): Promise<string[]> {
    const [first = '', second = first, third = second] = beginnings.map(pattern);
    const values = { workshopId, kind: this.kind, first, second, third, limit: fewAtMost + 1 };
    const rows = await this.database.select<{ id: string }>(
      beginnings.length === 1 ? subjectsWithOne : subjectsWithThree,
      values,
    );
    return rows.map(({ id }) => id);
  }
}

const narrowing = (few: readonly string[] | undefined, common: readonly string[]): Narrowing => ({
  few,
  common,
  isBeyondCounting: !few && common.length > 0 && common.length <= joinedAtMost,
});

function inEvery(lists: readonly (readonly string[])[]): string[] {
  const [first = [], ...others] = lists;
  const sets = others.map((list) => new Set(list));
  return first.filter((id) => sets.every((set) => set.has(id)));
}
