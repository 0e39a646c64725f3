import convert from 'convert-units';

type MetricUnit = 'mm' | 'cm' | 'm' | 'mm2' | 'cm2' | 'm2' | 'g' | 'kg' | 'ml' | 'l' | 'cm3' | 'm3';

/**
 * A figure in another metric unit of the same kind, for showing. Never used between inch and metric, or troy and gram, where the
 * package's factors are rounded: those go through `exact-factors`.
 */
export const inMetric = (figure: number, from: MetricUnit, to: MetricUnit): number => convert(figure).from(from).to(to);
