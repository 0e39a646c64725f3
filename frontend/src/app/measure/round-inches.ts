const inch_mm = 25.4;
const squareInch_mm2 = inch_mm * inch_mm;

/** What a length is rounded to, as one would write it down: whole inches, quarters below 4 in, eighths below 1 in. */
const fineness_mm = (length_mm: number): number =>
  length_mm >= 4 * inch_mm ? inch_mm : length_mm >= inch_mm ? inch_mm / 4 : inch_mm / 8;

const exact = (figure: number): number => Math.round(figure * 1e6) / 1e6;

function roundLength(length_mm: number): number {
  if (length_mm === 0) return 0;
  const step_mm = fineness_mm(Math.abs(length_mm));
  return exact(Math.sign(length_mm) * Math.max(1, Math.round(Math.abs(length_mm) / step_mm)) * step_mm);
}

function rounded(name: string, figure: number): number {
  if (name.endsWith('_mm2')) return exact(Math.round(figure / squareInch_mm2) * squareInch_mm2);
  return name.endsWith('_mm') ? roundLength(figure) : figure;
}

/** The same with every length and area in it a round one in inches; for what is offered, never for what was measured. */
export function roundInches<T>(value: T, name = ''): T {
  if (typeof value === 'number') return rounded(name, value) as T;
  if (Array.isArray(value)) return value.map((inner: unknown) => roundInches(inner, name)) as T;
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(Object.entries(value).map(([key, inner]) => [key, roundInches(inner, key)])) as T;
}
