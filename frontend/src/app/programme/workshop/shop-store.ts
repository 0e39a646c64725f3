import { Injectable, computed, inject, linkedSignal, resource, signal } from '@angular/core';
import { canonicalJson } from '#shared/estimates/canonical-json';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import { keepShop, readShop } from '#shared/programme/programme-endpoints';
import { shopContentSchema, shopSchema, type ShopAnswer, type ShopContent } from '#shared/programme/shop-schema';
import type { CardSide } from '#shared/rate-cards/merged-values';
import { Api } from '../../core/api/api';
import { Formats } from '../../core/formats/formats';
import { Words } from '../../core/formats/words';
import { Notices } from '../../core/problems/notices';
import { ProblemError } from '../../core/problems/problem-error';
import { mergedShop, shopDifferences } from './merged-shop';
import { ShopWords } from './shop-words';

type Path = readonly (string | number)[];

/** The workshop as somebody else kept it meanwhile. */
const standingSchema = shopSchema.pick({ version: true, content: true });
type Standing = Pick<ShopAnswer, 'version' | 'content'>;

/** What the workshop has to work with, as it is being entered; nothing is sent before all of it is right. */
@Injectable()
export class ShopStore {
  private readonly api = inject(Api);
  private readonly words = inject(Words);
  private readonly formats = inject(Formats);
  private readonly notices = inject(Notices);
  private readonly reading = resource({
    loader: ({ abortSignal }) => this.api.call(readShop, { signal: abortSignal }),
  });
  private readonly tried = signal(false);
  private readonly sending = signal(false);
  private readonly refusals = signal<readonly { readonly path: string; readonly text: string }[]>([]);

  private readonly meanwhile = signal<Standing | undefined>(undefined);

  readonly answer = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  readonly problem = computed(() => this.reading.error()?.message);
  /** As it stands in the entries, right or wrong. */
  readonly content = linkedSignal<ShopContent | undefined>(() => this.answer()?.content);
  readonly isDirty = computed(() => this.content() !== this.answer()?.content);
  readonly isSending = this.sending.asReadonly();
  /** Nothing was entered yet: what stands is assumed. */
  readonly isAssumed = computed(() => this.answer()?.version === 0);
  /** The lines somebody else changed too, in words; undefined while nobody did. */
  readonly differences = computed(() => {
    const [answer, sides] = [this.answer(), this.sides()];
    return answer && sides && shopDifferences(sides, new ShopWords(this.formats, answer));
  });
  private readonly sides = computed(() => {
    const [base, mine, theirs] = [this.answer()?.content, this.content(), this.meanwhile()?.content];
    return base && mine && theirs && { base, mine, theirs };
  });
  private readonly complaints = computed(() => {
    const content = this.content();
    if (!content || !this.tried()) return this.refusals();
    const parsed = readBy(shopContentSchema, content);
    const own = parsed.success ? [] : complaintsOf(parsed.error);
    const told = own.map(({ path, code, values }) => ({ path: path.join('.'), text: this.words.say(code, values) }));
    return [...told, ...this.refusals()];
  });
  readonly general = computed(() =>
    this.complaints()
      .filter(({ path }) => path === '')
      .map(({ text }) => text),
  );

  /** What to say beside an entry, or beside anything within it. */
  message(...path: Path): string {
    const whole = path.join('.');
    return (
      this.complaints().find((one) => one.path === whole || (path.length > 0 && one.path.startsWith(`${whole}.`)))
        ?.text ?? ''
    );
  }

  change(change: Partial<ShopContent>): void {
    this.refusals.set([]);
    this.content.update((content) => content && { ...content, ...change });
  }

  /** True where it was kept. */
  async keep(): Promise<boolean> {
    const [answer, content] = [this.answer(), this.content()];
    this.tried.set(true);
    if (!answer || !content || this.sending() || !readBy(shopContentSchema, content).success) return false;
    this.sending.set(true);
    try {
      const kept = await this.api.call(keepShop, { body: content, version: answer.version });
      this.reading.set(kept);
      this.tried.set(false);
      return true;
    } catch (error) {
      if (!(error instanceof ProblemError)) throw error;
      this.refuse(error);
    } finally {
      this.sending.set(false);
    }
    return this.meanwhile() && this.differences()?.length === 0 ? this.join() : false;
  }

  /** The lines both changed are of one side; everything else of both stands. */
  async settle(side: CardSide): Promise<boolean> {
    const [answer, theirs, sides] = [this.answer(), this.meanwhile(), this.sides()];
    if (!answer || !theirs || !sides) return false;
    const merged = mergedShop(sides, side);
    this.meanwhile.set(undefined);
    this.reading.set({ ...answer, ...theirs });
    if (canonicalJson(merged) === canonicalJson(theirs.content)) return true;
    this.content.set(merged);
    return this.keep();
  }

  reload(): void {
    this.refusals.set([]);
    this.meanwhile.set(undefined);
    this.reading.reload();
  }

  /** Somebody was faster, and changed other lines. */
  private async join(): Promise<boolean> {
    const isKept = await this.settle('mine');
    if (isKept) this.notices.say($localize`Somebody else changed other lines meanwhile; theirs and yours both stand.`);
    return isKept;
  }

  private refuse(error: ProblemError): void {
    const standing = error.isStale ? standingSchema.safeParse(error.problem.current) : undefined;
    if (standing?.success) {
      this.meanwhile.set(standing.data);
      return;
    }
    const told = error.problem.errors.map(({ path, message }) => ({ path: path.join('.'), text: message }));
    this.refusals.set([{ path: '', text: error.message }, ...told]);
  }
}
