/** When each of several people is busy, in order; bookings of one person never overlap, except where they have happened so. */
export class Bookings {
  private readonly starts: number[][];
  private readonly ends: number[][];

  constructor(people: number) {
    this.starts = Array.from({ length: people }, () => []);
    this.ends = Array.from({ length: people }, () => []);
  }

  add(people: readonly number[], start: number, end: number): void {
    if (end <= start) return;
    for (const person of people) {
      const place = this.placeOf(person, start);
      this.starts[person].splice(place, 0, start);
      this.ends[person].splice(place, 0, end);
    }
  }

  remove(people: readonly number[], start: number, end: number): void {
    if (end <= start) return;
    for (const person of people) {
      let place = this.placeOf(person, start);
      while (this.starts[person][place] !== start || this.ends[person][place] !== end) place += 1;
      this.starts[person].splice(place, 1);
      this.ends[person].splice(place, 1);
    }
  }

  /** When the last of those that overlap a span is over, by the first of the people that is busy in it; null where all are free. */
  busyUntil(people: readonly number[], start: number, end: number): number | null {
    for (const person of people) {
      const place = this.placeOf(person, start);
      if (place < this.starts[person].length && this.starts[person][place] < end) return this.ends[person][place];
    }
    return null;
  }

  /** The place of the first booking that ends after a moment. */
  private placeOf(person: number, moment: number): number {
    const ends = this.ends[person];
    let [first, last] = [0, ends.length];
    while (first < last) {
      const middle = (first + last) >> 1;
      if (ends[middle] > moment) last = middle;
      else first = middle + 1;
    }
    return first;
  }
}
