import { countDown, settled } from '#shared/money/settled';

/** A run to be filled with repeats, in mm: its whole length, what its mitre leaves and its centrepiece take. */
export interface Run {
  readonly run_mm: number;
  readonly mitreLeaf_mm: number;
  readonly mitreLeaves: number;
  readonly centre_mm: number | null;
}

/** Whole repeats on a run. */
export interface RunFit {
  /** On the whole run, both halves together. */
  readonly repeats: number;
  /** 2 beside a centrepiece, else 1. */
  readonly halves: 1 | 2;
  /** Length the repeats fill, both halves together; zero or less where nothing is left for them. */
  readonly free_mm: number;
  /** One repeat as it is carved. */
  readonly pitch_mm: number;
  /** Carved pitch ÷ module − 1: above zero the repeats are stretched, below they are pressed together. */
  readonly stretch: number;
}

// |stretch| of n repeats on a length of so many modules; n is at least 1.
const strain = (modules: number, repeats: number): number => settled(Math.abs(modules / repeats - 1));

function bestCount(modules: number): number {
  const fewer = Math.max(1, countDown(modules));
  return strain(modules, fewer + 1) < strain(modules, fewer) ? fewer + 1 : fewer;
}

/**
 * The whole number of repeats of a module (mm, > 0) that stretches least, ties to fewer, on a run less mitre leaves and centrepiece;
 * each half is fitted apart when there is a centre. Zero repeats where no length is left.
 */
export function runFit(run: Run, module_mm: number): RunFit {
  if (module_mm <= 0) throw new RangeError('a module must have a length');
  const halves = run.centre_mm === null ? 1 : 2;
  const free_mm = run.run_mm - run.mitreLeaf_mm * run.mitreLeaves - (run.centre_mm ?? 0);
  if (settled(free_mm) <= 0)
    return { repeats: 0, halves, free_mm: Math.min(0, free_mm), pitch_mm: module_mm, stretch: 0 };
  const modules = free_mm / halves / module_mm;
  const each = bestCount(modules);
  const pitch_mm = free_mm / halves / each;
  return { repeats: each * halves, halves, free_mm, pitch_mm, stretch: pitch_mm / module_mm - 1 };
}
