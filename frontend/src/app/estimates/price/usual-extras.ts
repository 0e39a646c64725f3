import type { ExtraLine } from '#shared/estimates/settings';
import { D, type DecimalText } from '#shared/money/decimal';
import type { RateCard } from '#shared/rate-cards/rate-card';
import { newId } from '../../core/new-id';

/** Lines an estimate often has besides its members, by what they are for. */
export const usualExtras = [
  'sample',
  'packing',
  'transport',
  'fitting',
  'touching-in',
  'insurance',
  'timber',
  'joinery',
  'turning',
  'hours',
  'bought-in',
  'paid-quantity',
  'price',
] as const;
export type UsualExtra = (typeof usualExtras)[number];

/** What new lines are made from: the card, the tax of the estimate, and the timber most members are of. */
export interface ExtraStart {
  readonly card: RateCard;
  readonly taxCategoryId: string;
  readonly timberId: string | undefined;
}

type Labour = Extract<ExtraLine, { kind: 'labour' }>;

/** What booklets cost, written with the decimals of their price. */
function bookletsCost(price: DecimalText, booklets: number): DecimalText {
  const decimals = price.split('.').at(1)?.length ?? 0;
  return new D(price).times(booklets).toFixed(decimals);
}

/** Makes the lines of each usual thing, at the figures the rate card has for it. */
class ExtraMaker {
  constructor(private readonly start: ExtraStart) {}

  of(usual: UsualExtra): ExtraLine[] {
    const makers: Readonly<Record<UsualExtra, () => ExtraLine[]>> = {
      sample: () => this.sampleBoard(),
      packing: () => this.packing(),
      transport: () => [this.boughtIn($localize`Transport`, '0')],
      fitting: () => this.fitting(),
      'touching-in': () => this.touchingIn(),
      insurance: () => this.insurance(),
      timber: () => this.timber(),
      joinery: () => [this.labour($localize`Joinery`, 'making', [this.making.joineryGradeId, 0])],
      turning: () => [this.labour($localize`Turning`, 'making', [this.making.turningGradeId, 0])],
      hours: () => [this.labour($localize`Work by the hour`, 'other', [this.start.card.money.grades[0]?.id ?? '', 0])],
      'bought-in': () => [this.boughtIn($localize`Bought in`, '0')],
      'paid-quantity': () => this.paidQuantity(),
      price: () => [{ ...this.frame($localize`Other work`), kind: 'price', price: '0' }],
    };
    return makers[usual]();
  }

  private get making() {
    return this.start.card.money.making;
  }

  private get extras() {
    return this.start.card.money.extras;
  }

  private frame(name: string) {
    const { taxCategoryId } = this.start;
    return { id: newId(), name, taxCategoryId, memberId: null, alternativeId: null };
  }

  private labour(name: string, work: Labour['work'], [gradeId, hours]: readonly [string, number]): ExtraLine {
    return { ...this.frame(name), kind: 'labour', work, gradeId, hours };
  }

  private boughtIn(name: string, cost: DecimalText): ExtraLine {
    return { ...this.frame(name), kind: 'bought-in', cost };
  }

  private sampleBoard(): ExtraLine[] {
    const { hours, gradeId, booklets, leafProductId } = this.extras.sampleBoard;
    const leaf = this.start.card.leaf.products.find(({ id }) => id === leafProductId);
    const work = this.labour($localize`Sample board`, 'sample', [gradeId, hours]);
    if (!leaf || booklets === 0) return [work];
    return [work, this.boughtIn($localize`Leaf for the sample board`, bookletsCost(leaf.price, booklets))];
  }

  private packing(): ExtraLine[] {
    const { hours, gradeId, crate } = this.extras.packing;
    return [this.labour($localize`Packing`, 'packing', [gradeId, hours]), this.boughtIn($localize`Crate`, crate)];
  }

  private fitting(): ExtraLine[] {
    const { people, hours, gradeId } = this.extras.fitting;
    return [this.labour($localize`Fitting on site`, 'fitting', [gradeId, people * hours])];
  }

  private touchingIn(): ExtraLine[] {
    const { hours, gradeId } = this.extras.touchingIn;
    return [this.labour($localize`Touching in on site`, 'fitting', [gradeId, hours])];
  }

  private insurance(): ExtraLine[] {
    const { insurance_percent: percent } = this.extras;
    return [{ ...this.frame($localize`Insurance in care`), kind: 'insurance', percent, value: null }];
  }

  private timber(): ExtraLine[] {
    const { timbers, waste_percent } = this.making;
    const timber = timbers.find(({ timberId }) => timberId === this.start.timberId) ?? timbers.at(0);
    const name = timber ? $localize`Timber, ${timber.name}:timber:` : $localize`Timber`;
    return [
      {
        ...this.frame(name),
        kind: 'timber',
        volume_dm3: 0,
        price_per_dm3: timber?.pricePerDm3 ?? '0',
        waste_percent,
      },
    ];
  }

  private paidQuantity(): ExtraLine[] {
    const rule = $localize`the workshop’s own rule`;
    return [
      { ...this.frame($localize`Measured work`), kind: 'paid-quantity', rule, quantity: '1', unit: 'm', price: '0' },
    ];
  }
}

/** The lines of one usual thing at the figures of the rate card, each with an id of its own. */
export const extraLinesOf = (usual: UsualExtra, start: ExtraStart): ExtraLine[] => new ExtraMaker(start).of(usual);
