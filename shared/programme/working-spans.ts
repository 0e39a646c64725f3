import type { MomentSpan } from '#shared/programme/shop-calendar';

/** A span of working hours; spans of one group belong to one day, with nothing but its usual pauses between them. */
export interface GroupedSpan extends MomentSpan {
  readonly group: number;
}

/** Working hours over the whole time that is planned, in order, with what is asked of them answered in the logarithm of their number. */
export class WorkingSpans {
  private readonly starts: Float64Array;
  private readonly ends: Float64Array;
  /** Working minutes before each span. */
  private readonly before: Float64Array;
  /** Working minutes before the end of the group of each span, and the place of the next group. */
  private readonly groupEnd: Float64Array;
  private readonly nextGroup: Int32Array;
  private readonly longestGroup: number;
  readonly total_minutes: number;

  constructor(readonly spans: readonly GroupedSpan[]) {
    const count = spans.length;
    this.starts = Float64Array.from(spans, (span) => span.start_minutes);
    this.ends = Float64Array.from(spans, (span) => span.end_minutes);
    this.before = new Float64Array(count + 1);
    for (let at = 0; at < count; at += 1) this.before[at + 1] = this.before[at] + this.ends[at] - this.starts[at];
    this.total_minutes = this.before[count];
    this.groupEnd = new Float64Array(count);
    this.nextGroup = new Int32Array(count);
    this.longestGroup = this.closeGroups();
  }

  /** The first moment of work at or after a moment; Infinity where there is none. */
  startAt(moment: number): number {
    const at = this.placeOf(moment);
    return at < this.starts.length ? Math.max(moment, this.starts[at]) : Infinity;
  }

  /** Working minutes before a moment. */
  workedBy(moment: number): number {
    const at = this.placeOf(moment);
    if (at === this.starts.length) return this.total_minutes;
    return this.before[at] + Math.max(0, moment - this.starts[at]);
  }

  /** The first moment by which so many minutes are worked; Infinity where there are not so many. */
  momentOf(worked: number): number {
    if (worked > this.total_minutes) return Infinity;
    if (worked <= 0) return this.starts[0] ?? Infinity;
    let [first, last] = [0, this.starts.length - 1];
    while (first < last) {
      const middle = (first + last) >> 1;
      if (this.before[middle + 1] >= worked) last = middle;
      else first = middle + 1;
    }
    return this.starts[first] + worked - this.before[first];
  }

  /** The end of so many minutes of work begun at a moment of work and laid down only where nobody works. */
  endOf(start: number, work: number): number {
    return this.momentOf(this.workedBy(start) + work);
  }

  /** The first moment of work from which so many minutes of work end at a moment or later: what starts before it ends too early. */
  startFor(end: number, work: number): number {
    const by = this.workedBy(end);
    // Nobody works up to a moment of the night: to end after it, a minute more has to be worked.
    const worked = (this.momentOf(by) < end ? by + 1 : by) - work;
    return worked <= 0 ? -Infinity : this.startAt(this.momentOf(worked));
  }

  /** The first start at or after a moment from which so many minutes are worked on one day; Infinity where there is none. */
  unbrokenStart(moment: number, work: number): number {
    if (work > this.longestGroup) return Infinity;
    let at = this.placeOf(moment);
    while (at < this.starts.length) {
      const start = Math.max(moment, this.starts[at]);
      if (this.before[at] + start - this.starts[at] + work <= this.groupEnd[at]) return start;
      at = this.nextGroup[at];
    }
    return Infinity;
  }

  /** The working spans between two moments. */
  between(start: number, end: number): MomentSpan[] {
    const found: MomentSpan[] = [];
    for (let at = this.placeOf(start); at < this.starts.length && this.starts[at] < end; at += 1)
      found.push({ start_minutes: Math.max(start, this.starts[at]), end_minutes: Math.min(end, this.ends[at]) });
    return found;
  }

  /** The same hours seen backward: moment t becomes −t. */
  mirrored(): WorkingSpans {
    return new WorkingSpans(
      this.spans
        .map(({ start_minutes, end_minutes, group }) => ({
          start_minutes: -end_minutes,
          end_minutes: -start_minutes,
          group,
        }))
        .reverse(),
    );
  }

  /** The place of the first span that ends after a moment. */
  private placeOf(moment: number): number {
    let [first, last] = [0, this.ends.length];
    while (first < last) {
      const middle = (first + last) >> 1;
      if (this.ends[middle] > moment) last = middle;
      else first = middle + 1;
    }
    return first;
  }

  private closeGroups(): number {
    let longest = 0;
    for (let at = this.spans.length - 1; at >= 0; at -= 1) {
      const isLast = this.spans[at + 1]?.group !== this.spans[at].group;
      this.groupEnd[at] = isLast ? this.before[at + 1] : this.groupEnd[at + 1];
      this.nextGroup[at] = isLast ? at + 1 : this.nextGroup[at + 1];
      longest = Math.max(longest, this.groupEnd[at] - this.before[at]);
    }
    return longest;
  }
}
