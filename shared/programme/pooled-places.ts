import type { Shop, ShopPlace } from '#shared/programme/shop';

/** All racks of a workshop together, or all its benches: a lot stands on whichever has room, a carver takes whichever bench is free. */
export interface PooledPlaces {
  /** The id of the first of them. */
  readonly id: string;
  readonly name: string;
  readonly kind: ShopPlace['kind'];
  readonly capacity: number;
  readonly placeIds: readonly string[];
}

const kinds: readonly ShopPlace['kind'][] = ['rack', 'bench'];

/** The racks and the benches of a workshop, each kind as one with all that its places hold (in places); a kind it has none of is left out. */
export const pooledPlaces = ({ places }: Pick<Shop, 'places'>): PooledPlaces[] =>
  kinds.flatMap((kind) => {
    const own = places.filter((place) => place.kind === kind);
    const [first] = own;
    if (!first) return [];
    return [
      {
        ...{ id: first.id, kind, name: own.map(({ name }) => name).join(', ') },
        capacity: own.reduce((sum, { capacity }) => sum + capacity, 0),
        placeIds: own.map(({ id }) => id),
      },
    ];
  });
