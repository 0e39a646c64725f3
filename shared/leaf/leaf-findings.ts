import { caratOf } from '#shared/leaf/carat-of';
import type { LaidGround } from '#shared/leaf/laid-ground';
import type { LayingWay } from '#shared/leaf/leaf-card';
import type { LeafProduct } from '#shared/leaf/leaf-product';
import type { ZoneLeafInput } from '#shared/leaf/zone-leaf-input';
import type { Finding, FindingKind } from '#shared/words/finding';
import type { WordCode, WordValues } from '#shared/words/word-code';

interface Laid {
  readonly product: LeafProduct;
  readonly ground: LaidGround;
  readonly input: ZoneLeafInput;
  readonly way: LayingWay;
}

interface Rule {
  readonly kind: FindingKind;
  readonly code: WordCode;
  readonly applies: (laid: Laid) => boolean;
}

const carat = ({ carat: stated, alloy }: LeafProduct): number => stated ?? caratOf(alloy);

/** Whether a leaf tarnishes, so that the build-up has to seal it: silver, composition and gold under 22 carat (Eytzinger). */
export const needsSeal = (product: LeafProduct): boolean =>
  product.metal === 'silver' || product.metal === 'composition' || (product.metal === 'gold' && carat(product) < 22);

const isBase = ({ metal }: LeafProduct): boolean => metal === 'composition' || metal === 'aluminium';

const isCarved = ({ input, way }: Laid): boolean =>
  input.relief !== 'flat' || input.finish === 'carved' || way === 'patches';

const isFlat = (laid: Laid): boolean =>
  !isCarved(laid) && laid.input.surface.finish === 'plain' && laid.input.finish === 'plain';

// Common practice of the trade where no source is named.
const rules: readonly Rule[] = [
  {
    kind: 'warn',
    code: 'leaf-silver-unsealed',
    applies: ({ product, ground }) => product.metal === 'silver' && !ground.isSealed,
  },
  {
    kind: 'warn',
    code: 'leaf-unsealed',
    applies: ({ product, ground }) => product.metal !== 'silver' && needsSeal(product) && !ground.isSealed,
  },
  {
    kind: 'refuse',
    code: 'leaf-base-metal-on-water',
    applies: ({ product, ground }) => isBase(product) && ground.system === 'water',
  },
  {
    kind: 'refuse',
    code: 'leaf-transfer-on-water',
    applies: ({ product, ground }) => product.form === 'transfer' && ground.system === 'water',
  },
  {
    kind: 'warn',
    code: 'leaf-transfer-on-carving',
    applies: (laid) => laid.product.form === 'transfer' && isCarved(laid),
  },
  { kind: 'refuse', code: 'leaf-ribbon-not-flat', applies: (laid) => laid.product.form === 'ribbon' && !isFlat(laid) },
];

/** What the trade refuses or warns of when this leaf is laid on this ground and surface. */
export function leafFindings(input: ZoneLeafInput, product: LeafProduct, way: LayingWay): Finding[] {
  const laid = { product, ground: input.ground, input, way };
  const values: WordValues = { leaf: product.name, system: input.ground.system };
  return rules
    .filter((rule) => rule.applies(laid))
    .map(({ kind, code }) => ({ kind, code, values, about: input.zoneId }));
}
