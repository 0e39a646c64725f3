import { Injectable, computed, inject, linkedSignal, resource, signal } from '@angular/core';
import { complaintsOf, readBy } from '#shared/problems/complaints-of';
import { keepShop, readShop } from '#shared/programme/programme-endpoints';
import { shopContentSchema, type ShopContent } from '#shared/programme/shop-schema';
import { Api } from '../../core/api/api';
import { Words } from '../../core/formats/words';
import { ProblemError } from '../../core/problems/problem-error';

type Path = readonly (string | number)[];

/** What the workshop has to work with, as it is being entered; nothing is sent before all of it is right. */
@Injectable()
export class ShopStore {
  private readonly api = inject(Api);
  private readonly words = inject(Words);
  private readonly reading = resource({
    loader: ({ abortSignal }) => this.api.call(readShop, { signal: abortSignal }),
  });
  private readonly tried = signal(false);
  private readonly sending = signal(false);
  private readonly refusals = signal<readonly { readonly path: string; readonly text: string }[]>([]);

  readonly answer = computed(() => (this.reading.hasValue() ? this.reading.value() : undefined));
  readonly problem = computed(() => this.reading.error()?.message);
  /** As it stands in the entries, right or wrong. */
  readonly content = linkedSignal<ShopContent | undefined>(() => this.answer()?.content);
  readonly isDirty = computed(() => this.content() !== this.answer()?.content);
  readonly isSending = this.sending.asReadonly();
  /** Nothing was entered yet: what stands is assumed. */
  readonly isAssumed = computed(() => this.answer()?.version === 0);
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
      return false;
    } finally {
      this.sending.set(false);
    }
  }

  reload(): void {
    this.refusals.set([]);
    this.reading.reload();
  }

  private refuse(error: ProblemError): void {
    const told = error.problem.errors.map(({ path, message }) => ({ path: path.join('.'), text: message }));
    this.refusals.set([{ path: '', text: error.message }, ...told]);
  }
}
