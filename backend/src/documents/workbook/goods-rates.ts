import type { Material } from '#shared/buildups/buildup-card';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import type { ZoneLeaf } from '#shared/leaf/laying';
import type { RatesSheet } from './rates-sheet';
import type { WorkbookFacts } from './workbook-facts';

/** The names of what a leaf costs: a booklet at list, and what is off for whole packs. */
export interface LeafRates {
  readonly product: LeafProduct;
  readonly price: string;
  readonly inBooklet: string;
  readonly breaks: readonly { readonly booklets: number; readonly off: string }[];
}

/** The names of a pack's size and price, and what they are now. */
export interface PackRates {
  readonly id: string;
  readonly size: string;
  readonly price: string;
  readonly figures: { readonly size: number; readonly price: number };
}

/** The names of what a material costs: by its unit, or by the pack. */
export interface MaterialRates {
  readonly material: Material;
  readonly price: string;
  readonly packs: readonly PackRates[];
}

/** The names of what is lost in laying a zone. */
export interface LossRates {
  readonly breakage: string;
  readonly faulting: string;
  readonly second: string;
}

export interface GoodsRates {
  readonly leaf: readonly LeafRates[];
  readonly materials: readonly MaterialRates[];
  readonly losses: (leaf: ZoneLeaf) => LossRates;
}

function leafRates(rates: RatesSheet, product: LeafProduct, { words, snapshot }: WorkbookFacts): LeafRates {
  const { id, name, price, leavesPerBooklet, breaks } = product;
  const label = (code: 'sheet-leaf-price' | 'sheet-leaf-in-booklet') => words.say(code, { leaf: name });
  const { currency } = snapshot.workshop;
  return {
    product,
    price: rates.rate({
      label: label('sheet-leaf-price'),
      value: Number(price),
      unit: currency,
      name: ['leaf', id, 'price'],
    }),
    inBooklet: rates.rate({
      label: label('sheet-leaf-in-booklet'),
      value: leavesPerBooklet,
      unit: '',
      name: ['leaf', id, 'in_booklet'],
    }),
    breaks: breaks.map(({ booklets, off_percent }) => ({
      booklets,
      off: rates.rate({
        label: words.say('sheet-leaf-break', { leaf: name, booklets }),
        value: Number(off_percent),
        unit: '%',
        name: ['leaf', id, 'pack', String(booklets), 'off'],
      }),
    })),
  };
}

function materialRates(rates: RatesSheet, material: Material, { words, snapshot }: WorkbookFacts): MaterialRates {
  const { id, name, unit, pricePerUnit, packs } = material;
  const { currency } = snapshot.workshop;
  return {
    material,
    price: rates.rate({
      label: name,
      value: Number(pricePerUnit),
      unit: `${currency} / ${unit}`,
      name: ['material', id, 'price'],
    }),
    packs: packs.map((pack) => ({
      id: pack.id,
      figures: { size: Number(pack.size), price: Number(pack.price) },
      size: rates.rate({
        label: words.say('sheet-pack-size', { material: name }),
        value: Number(pack.size),
        unit,
        name: ['pack', id, pack.id, 'size'],
      }),
      price: rates.rate({
        label: words.say('sheet-pack-price', { material: name, size: words.figure('number', Number(pack.size)), unit }),
        value: Number(pack.price),
        unit: currency,
        name: ['pack', id, pack.id, 'price'],
      }),
    })),
  };
}

/** A zone burnished in part has a second laying of its own, by the share that is. */
function secondRate(
  { way, ground, losses }: Pick<ZoneLeaf, 'way' | 'ground' | 'losses'>,
  words: WorkbookFacts['words'],
): [string, number, string[]] {
  const finish = ground.finish.replaceAll('-', ' ');
  const [{ share }, ...others] = losses.secondLayings;
  const { likely } = losses.second_percent;
  if (others.length === 0) return [words.say('sheet-second', { way, finish }), likely, ['second', ground.finish, way]];
  const share_percent = share * 100;
  const label = words.say('leaf-second-parted', { way, share_percent });
  return [label, likely, ['second', ground.finish, String(Math.round(share_percent * 100)), way]];
}

/** Losses are written once for each way of laying, and for each finish it is laid to. */
function lossRates(rates: RatesSheet, { prepared, words }: WorkbookFacts): GoodsRates['losses'] {
  const known = new Map<string, string>();
  const write = (label: string, value: number, name: readonly string[]) => {
    const key = name.join('/');
    const made = known.get(key) ?? rates.rate({ label, value, unit: '%', name });
    known.set(key, made);
    return made;
  };
  rates.part(words.say('sheet-rates-losses'));
  const named = ({ way, ground, losses }: ZoneLeaf): LossRates => ({
    breakage: write(words.say('sheet-breakage', { way }), losses.breakage_percent.likely, ['breakage', way]),
    faulting: write(words.say('sheet-faulting', { way }), losses.faulting_percent.likely, ['faulting', way]),
    second: write(...secondRate({ way, ground, losses }, words)),
  });
  for (const { leaf } of prepared.work.zones) if (leaf) named(leaf);
  return named;
}

/** Writes what leaf and materials cost, as far as the issue uses them, and what is lost in laying. */
export function goodsRates(rates: RatesSheet, facts: WorkbookFacts): GoodsRates {
  const { work } = facts.prepared;
  const { card } = facts.snapshot;
  const losses = lossRates(rates, facts);
  const products = card.leaf.products.filter(({ id }) => work.leaf.some((total) => total.productId === id));
  const materials = card.buildUps.materials.filter(({ id }) => work.materials.some((one) => one.materialId === id));
  rates.part(facts.words.say('sheet-rates-goods'));
  return {
    losses,
    leaf: products.map((product) => leafRates(rates, product, facts)),
    materials: materials.map((material) => materialRates(rates, material, facts)),
  };
}
