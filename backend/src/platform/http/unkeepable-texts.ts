import type { Complaint } from '#shared/problems/complaint';
import { mostComplaints } from '#shared/problems/complaints-of';
import { isWellFormed } from '#shared/problems/is-well-formed';

interface Place {
  readonly name: string | number;
  readonly within: Place | undefined;
}

interface Entry {
  readonly value: unknown;
  readonly place: Place | undefined;
}

function pathOf(place: Place | undefined): Complaint['path'] {
  const path: (string | number)[] = [];
  for (let at = place; at; at = at.within) path.unshift(at.name);
  return path;
}

/** What stands in a list or an object. JSON knows minus nought, a workshop does not: it is read as nought. */
function* entriesOf({ value, place }: Entry): Generator<Entry> {
  if (typeof value !== 'object' || value === null || Buffer.isBuffer(value)) return;
  const isList = Array.isArray(value);
  for (const [name, inner] of Object.entries(value)) {
    if (Object.is(inner, -0)) (value as Record<string, unknown>)[name] = 0;
    yield { value: inner, place: { name: isList ? Number(name) : name, within: place } };
  }
}

const isUnkeepable = ({ value, place }: Entry): boolean =>
  (typeof value === 'string' && !isWellFormed(value)) || (typeof place?.name === 'string' && !isWellFormed(place.name));

/**
 * Complains of texts and names of a body that are no Unicode, which JSON can write and no database keeps, whatever schema they belong
 * to. Without recursion, since a body may be nested as deep as it is long.
 */
export function unkeepableTexts(body: unknown): Complaint[] {
  const complaints: Complaint[] = [];
  const left: Entry[] = [{ value: body, place: undefined }];
  for (let entry = left.pop(); entry && complaints.length < mostComplaints; entry = left.pop()) {
    if (isUnkeepable(entry)) complaints.push({ path: pathOf(entry.place), code: 'entry-wrong-form', values: {} });
    for (const inner of entriesOf(entry)) left.push(inner);
  }
  return complaints;
}
