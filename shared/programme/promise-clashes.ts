import type { PooledPlaces } from '#shared/programme/pooled-places';
import type { PromisedWork } from '#shared/programme/promised-work';
import type { MomentSpan } from '#shared/programme/shop-calendar';

/** Somebody promised to two things at one time, or a place to more than it holds, with the estimates concerned. */
export interface PromiseClash extends MomentSpan {
  readonly kind: 'person' | 'place';
  readonly id: string;
  readonly estimateIds: readonly string[];
}

interface Claim extends MomentSpan {
  readonly id: string;
  readonly amount: number;
  readonly estimateId: string;
}

/** Stretches of time in which claims on one thing come to more than there is of it; the same estimates going on are one stretch. */
function overClaims(claims: readonly Claim[], capacity: number): Omit<PromiseClash, 'kind' | 'id'>[] {
  const moments = [...new Set(claims.flatMap(({ start_minutes, end_minutes }) => [start_minutes, end_minutes]))];
  moments.sort((one, other) => one - other);
  const found: Omit<PromiseClash, 'kind' | 'id'>[] = [];
  moments.slice(1).forEach((end_minutes, at) => {
    const start_minutes = moments[at];
    const running = claims.filter((claim) => claim.start_minutes <= start_minutes && claim.end_minutes >= end_minutes);
    if (running.reduce((sum, { amount }) => sum + amount, 0) <= capacity) return;
    const estimateIds = [...new Set(running.map(({ estimateId }) => estimateId))].sort();
    const last = found.at(-1);
    const goesOn = last?.end_minutes === start_minutes && last.estimateIds.join() === estimateIds.join();
    if (last && goesOn) found[found.length - 1] = { ...last, end_minutes };
    else found.push({ start_minutes, end_minutes, estimateIds });
  });
  return found;
}

function claimsById(claims: readonly Claim[]): Map<string, Claim[]> {
  const byId = new Map<string, Claim[]>();
  for (const claim of claims) byId.set(claim.id, [...(byId.get(claim.id) ?? []), claim]);
  return byId;
}

/** What is promised twice: people at two tasks at once, racks and benches over what they hold; in the minutes of the frame of the work given. */
export function promiseClashes(promised: readonly PromisedWork[], places: readonly PooledPlaces[]): PromiseClash[] {
  const poolOf = (id: string) => places.find(({ placeIds }) => placeIds.includes(id))?.id ?? id;
  const people = promised.flatMap((work) =>
    work.people.map((span): Claim => ({ ...span, id: span.personId, amount: 1, estimateId: work.estimateId })),
  );
  const rooms = promised.flatMap((work) =>
    work.places.map((span): Claim => ({ ...span, id: poolOf(span.placeId), estimateId: work.estimateId })),
  );
  const capacityOf = (id: string) => places.find((place) => place.id === id)?.capacity ?? 0;
  return [
    ...[...claimsById(people)].flatMap(([id, claims]) =>
      overClaims(claims, 1).map((clash): PromiseClash => ({ kind: 'person', id, ...clash })),
    ),
    ...[...claimsById(rooms)].flatMap(([id, claims]) =>
      overClaims(claims, capacityOf(id)).map((clash): PromiseClash => ({ kind: 'place', id, ...clash })),
    ),
  ];
}
