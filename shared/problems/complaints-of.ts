import type * as z from 'zod';
import type { Complaint } from '#shared/problems/complaint';
import type { WordCode, WordValues } from '#shared/words/word-code';

type Issue = z.core.$ZodIssue;

/** What a schema's own rule says when it fails: a code of the catalogue with its values (pass it as the `error` of a refinement). */
export const complain = (code: WordCode, values: WordValues = {}) => ({ params: { code, values }, error: code });

const plain = (code: WordCode, values: WordValues = {}): Pick<Complaint, 'code' | 'values'> => ({ code, values });

/** The unit an entry is in, by the ending of its name: what stands in a list of `sides_mm` is in mm too. */
function inUnitOf(path: readonly PropertyKey[], name: 'minimum' | 'maximum', limit: number): WordValues {
  const entry = path.findLast((part) => typeof part === 'string') ?? '';
  const unit = /_[a-zµ0-9]+$/.exec(String(entry))?.[0] ?? '';
  return { [`${name}${unit}`]: limit };
}

function tooSmall(issue: Extract<Issue, { code: 'too_small' }>) {
  const minimum = Number(issue.minimum);
  if (issue.origin === 'string') return minimum === 1 ? plain('entry-missing') : plain('entry-too-short', { minimum });
  if (issue.origin === 'array') return plain('entry-too-few', { minimum });
  return plain(issue.inclusive ? 'entry-too-small' : 'entry-not-above', inUnitOf(issue.path, 'minimum', minimum));
}

function tooBig(issue: Extract<Issue, { code: 'too_big' }>) {
  const maximum = Number(issue.maximum);
  if (issue.origin === 'string') return plain('entry-too-long', { maximum });
  if (issue.origin === 'array') return plain('entry-too-many', { maximum });
  return plain(issue.inclusive ? 'entry-too-large' : 'entry-not-below', inUnitOf(issue.path, 'maximum', maximum));
}

/** Nothing stands there. Only a schema that was asked to report what it read (`readBy`) tells. */
const isEmpty = (issue: Issue): boolean =>
  'input' in issue && (issue.input === undefined || issue.input === null || issue.input === '');

/** A pattern made with `complain` names its code as its message. */
function formCode({ format, message }: Extract<Issue, { code: 'invalid_format' }>): WordCode {
  if (message.startsWith('entry-')) return message as WordCode;
  return format === 'email' ? 'entry-not-email' : 'entry-wrong-form';
}

function worded(issue: Issue): Pick<Complaint, 'code' | 'values'> {
  if (issue.code.startsWith('invalid_') && isEmpty(issue)) return plain('entry-missing');
  switch (issue.code) {
    case 'custom': {
      const own = issue.params as { code?: WordCode; values?: WordValues } | undefined;
      return plain(own?.code ?? 'entry-wrong-form', own?.values ?? {});
    }
    case 'too_small':
      return tooSmall(issue);
    case 'too_big':
      return tooBig(issue);
    case 'invalid_type':
      return plain(issue.expected === 'int' ? 'entry-not-whole' : 'entry-wrong-kind');
    case 'invalid_format':
      return plain(formCode(issue));
    case 'unrecognized_keys':
      return plain('entry-unknown');
    default:
      return plain('entry-not-offered');
  }
}

/** Reads a value by its schema, so that `complaintsOf` can tell what is missing from what is of the wrong kind. */
export const readBy = <S extends z.ZodType>(schema: S, value: unknown): z.ZodSafeParseResult<z.output<S>> =>
  schema.safeParse(value, { reportInput: true });

/** So many complaints are told; whoever sends a hundred thousand wrong entries gets no answer as long. */
export const mostComplaints = 100;

/** Where an issue stands, at most so many places: an unknown key is complained of at its own path. */
function pathsOf(issue: Issue, most: number): Complaint['path'][] {
  const path = issue.path.map((part) => (typeof part === 'symbol' ? String(part) : part));
  if (issue.code !== 'unrecognized_keys') return [path].slice(0, most);
  return issue.keys.slice(0, most).map((key) => [...path, key]);
}

/** The complaints of a failed parse, worded by code, in the order of the fields; the last one says how many more there are than `most`. */
export function complaintsOf(error: z.core.$ZodError, most = mostComplaints): Complaint[] {
  const complaints: Complaint[] = [];
  let count = 0;
  for (const issue of error.issues) {
    count += issue.code === 'unrecognized_keys' ? issue.keys.length : 1;
    for (const path of pathsOf(issue, most - complaints.length)) complaints.push({ path, ...worded(issue) });
  }
  return count > most ? [...complaints, { path: [], ...plain('entries-more', { count: count - most }) }] : complaints;
}
