import type { ProgrammeItem } from '#shared/programme/programme-item';
import type { ProgrammeRequest } from '#shared/programme/programme-request';
import type { Shop } from '#shared/programme/shop';
import type { Finding } from '#shared/words/finding';

function handFindings(items: readonly ProgrammeItem[], { people }: Shop): Finding[] {
  const missing = new Map<string, { grade: string; hands_minutes: number }>();
  for (const { gradeId, grade, handsOn_minutes } of items) {
    if (handsOn_minutes === 0 || people.some((person) => person.gradeIds.includes(gradeId))) continue;
    const known = missing.get(gradeId)?.hands_minutes ?? 0;
    missing.set(gradeId, { grade, hands_minutes: known + handsOn_minutes });
  }
  return [...missing.values()].map((values) => ({ kind: 'refuse', code: 'programme-no-hand', values }));
}

function crewFindings({ tasks }: ProgrammeRequest, items: readonly ProgrammeItem[], { people }: Shop): Finding[] {
  return tasks.flatMap(({ id, name, gradeId, crew }): Finding[] => {
    const able = people.filter((person) => person.gradeIds.includes(gradeId)).length;
    if (able === 0 || crew <= able) return [];
    const grade = items.find(({ taskId }) => taskId === id)?.grade ?? gradeId;
    return [
      { kind: 'refuse', code: 'programme-crew-short', values: { task: name, crew, grade, people: able }, about: id },
    ];
  });
}

function placeFindings({ placeHolds, places }: ProgrammeRequest, items: readonly ProgrammeItem[]): Finding[] {
  return placeHolds.flatMap(({ placeId, amount, fromTaskId }): Finding[] => {
    const place = places.find(({ id }) => id === placeId);
    if (!place || amount <= place.capacity) return [];
    const lot = items.find(({ taskId }) => taskId === fromTaskId)?.lot ?? '';
    const values = { lot, amount, place: place.name, capacity: place.capacity };
    return [{ kind: 'refuse', code: 'programme-place-short', values, about: fromTaskId }];
  });
}

/** A step that is planned in portions says so once. */
function portionFindings(items: readonly ProgrammeItem[]): Finding[] {
  const told = new Map<string, Finding>();
  for (const { lotId, lot, stepId, name: step, portions } of items) {
    const key = `${lotId} ${String(portions)}`;
    if (portions < 2 || stepId === null || told.has(key)) continue;
    told.set(key, { kind: 'note', code: 'programme-in-portions', values: { step, lot, portions }, about: lotId });
  }
  return [...told.values()];
}

/** Who helps at work that takes several at once is planned for, and stands in no price: the estimate counts hands-on time once. */
function helpFindings({ tasks }: ProgrammeRequest): Finding[] {
  const hands_minutes = tasks.reduce((sum, task) => sum + Math.max(0, task.crew - 1) * task.handsOn_minutes, 0);
  return hands_minutes === 0 ? [] : [{ kind: 'note', code: 'programme-hands-beyond', values: { hands_minutes } }];
}

/** What stands in the way of planning, or is to be known of it, before anything is planned: grades nobody has, crews and racks that are too few, portions, help that is not priced. */
export const requestFindings = (request: ProgrammeRequest, items: readonly ProgrammeItem[], shop: Shop): Finding[] => [
  ...handFindings(items, shop),
  ...crewFindings(request, items, shop),
  ...placeFindings(request, items),
  ...portionFindings(items),
  ...helpFindings(request),
];
