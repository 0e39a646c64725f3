import { ChangeDetectionStrategy, Component, computed, inject, input } from '@angular/core';
import type { ClientIssue } from '#shared/client-page/client-issue-schema';
import type { ClientPrice } from '#shared/client-page/client-price-schema';
import { measuredNote } from '#shared/documents/measured-note';
import { sectionsByKind, sectionsByMember } from '#shared/estimates/price/price-sections';
import { isOutsideTax, reasonOutsideTax } from '#shared/money/is-outside-tax';
import { Formats } from '../core/formats/formats';
import { Words } from '../core/formats/words';

type Line = ClientPrice['lines'][number];

interface Row {
  readonly id: string;
  readonly name: string;
  readonly price: string;
  readonly parts: readonly {
    readonly id: string;
    readonly name: string;
    readonly note: string;
    readonly price: string;
  }[];
}

/** What is included and what it comes to: by member or by kind of work, each head opening to its lines, then discount, tax and total. */
@Component({
  selector: 'app-client-lines',
  changeDetection: ChangeDetectionStrategy.OnPush,
  templateUrl: './client-lines.html',
  styleUrl: './client-lines.scss',
})
export class ClientLines {
  private readonly formats = inject(Formats);
  private readonly words = inject(Words);

  readonly issue = input.required<ClientIssue>();
  readonly price = input.required<ClientPrice>();

  private readonly memberNames = computed(
    () => new Map(this.issue().pieces.flatMap(({ members }) => members.map(({ id, name }) => [id, name] as const))),
  );
  protected readonly rows = computed(() => (this.issue().presentation === 'members' ? this.byMember() : this.byKind()));
  protected readonly sums = computed(() => this.sumsOf(this.price()));
  /** Why nothing is taxed, where nothing is: then the total stands alone. */
  protected readonly untaxed = computed(() => reasonOutsideTax(this.price().taxes));
  protected readonly total = computed(() => this.formats.money(this.price().gross_minor));

  private byMember(): Row[] {
    const order = [...this.memberNames().keys()];
    const placeOf = (key: string | null) => (key === null ? order.length : order.indexOf(key));
    return sectionsByMember(this.price().lines)
      .toSorted((one, other) => placeOf(one.key) - placeOf(other.key))
      .map(({ key, lines, price_minor }) =>
        this.row({ id: key ?? 'whole', name: this.memberName(key), lines, price_minor }, (line) => this.kindName(line)),
      );
  }

  private byKind(): Row[] {
    return sectionsByKind(this.price().lines).map(({ key, lines, price_minor }) =>
      this.row({ id: key, name: this.words.say(`work-kind-${key}`), lines, price_minor }, (line) =>
        this.memberName(line.memberId),
      ),
    );
  }

  private row(
    head: { id: string; name: string; lines: readonly Line[]; price_minor: number },
    nameOf: (line: Line) => string,
  ): Row {
    const parts = head.lines.map((line) => ({
      id: line.id,
      name: line.name ?? nameOf(line),
      note: this.noteOf(line),
      price: this.formats.money(line.price_minor),
    }));
    return { id: head.id, name: head.name, price: this.formats.money(head.price_minor), parts };
  }

  private noteOf({ measured }: Line): string {
    if (!measured) return '';
    const quantity = this.formats.figure('number', Number(measured.quantity));
    return measuredNote({ ...measured, quantity }, (code, values) => this.words.say(code, values));
  }

  private memberName(memberId: string | null): string {
    const known = memberId === null ? undefined : this.memberNames().get(memberId);
    return known ?? this.words.say('paper-general-lines');
  }

  private kindName({ kind }: Line): string {
    return this.words.say(`work-kind-${kind}`);
  }

  private sumsOf(price: ClientPrice): { name: string; amount: string }[] {
    const written = (amount_minor: number) => this.formats.money(amount_minor);
    const discount = { name: this.words.say('paper-discount'), amount: written(-price.discount_minor) };
    const discounts = price.discount_minor === 0 ? [] : [discount];
    if (isOutsideTax(price.taxes)) return discounts;
    return [
      ...discounts,
      { name: this.words.say('paper-net'), amount: written(price.net_minor) },
      ...price.taxes.map((tax) => ({ name: this.taxName(tax), amount: written(tax.tax_minor) })),
    ];
  }

  private taxName({ name, percent, net_minor, exemptionReason }: ClientPrice['taxes'][number]): string {
    if (Number(percent) === 0) return exemptionReason ? `${name}: ${exemptionReason}` : name;
    return this.words.say('paper-tax', { name, rate_percent: Number(percent), net_minor });
  }
}
