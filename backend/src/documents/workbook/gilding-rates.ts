import type { BuildUp, BuildUpStep } from '#shared/buildups/buildup';
import { finishes, reliefs, type Relief, type SurfaceFinish } from '#shared/measure/relief';
import type { RatesSheet } from './rates-sheet';
import type { WorkbookFacts } from './workbook-facts';

/** The names of the figures that turn areas and leaves into hands-on hours. */
export interface GildingRates {
  readonly relief: Readonly<Record<Relief, string>>;
  readonly measuredInTheRound: string;
  readonly finish: Readonly<Record<SurfaceFinish, string>>;
  readonly smoothing: Readonly<Record<SurfaceFinish, string>>;
  readonly laying: Readonly<Record<'sheets' | 'lays' | 'patches' | 'ribbon', string>>;
  readonly onSize: string;
  readonly transferFlat: string;
  readonly transferCarved: string;
  readonly spread: string;
  readonly painted: string;
  readonly consolidating: string;
  readonly cleaning: string;
  readonly edge: string;
  readonly setUp: string;
  readonly workingDay: string;
  readonly productive: string;
  readonly burnished: string;
  /** Hours a square metre of a step that goes by area. */
  readonly step: (buildUp: BuildUp, step: BuildUpStep) => string;
}

type Write = (code: string, value: number, at: { unit: string; name: readonly string[] }) => string;

function stepRates(rates: RatesSheet, facts: WorkbookFacts): GildingRates['step'] {
  const { words, prepared } = facts;
  const unit = words.say('sheet-unit-hours-a-square-metre');
  const used = [...new Set(prepared.work.zones.flatMap(({ buildUp }) => (buildUp ? [buildUp] : [])))];
  rates.part(words.say('sheet-rates-steps'));
  const names = new Map<string, string>();
  for (const buildUp of used) {
    for (const step of buildUp.steps) {
      if (step.work.way !== 'area') continue;
      const label = words.say('sheet-step-of', { step: step.name, buildup: buildUp.name });
      const value = step.work.hours_m2;
      names.set(
        `${buildUp.id}/${step.id}`,
        rates.rate({ label, value, unit, name: ['hours_m2', buildUp.id, step.id] }),
      );
    }
  }
  return (buildUp, step) => names.get(`${buildUp.id}/${step.id}`) ?? '0';
}

const byKey = <Key extends string>(keys: readonly Key[], name: (key: Key) => string): Record<Key, string> =>
  Object.fromEntries(keys.map((key) => [key, name(key)])) as Record<Key, string>;

function factorRates(write: Write, { snapshot, words }: WorkbookFacts) {
  const { buildUps, measure } = snapshot.card;
  const factor = { unit: '×' };
  return {
    relief: byKey(reliefs, (relief) =>
      write(words.say('sheet-relief', { relief: relief.replaceAll('-', ' ') }), measure.reliefFactors[relief], {
        ...factor,
        name: ['relief', relief],
      }),
    ),
    measuredInTheRound: write(words.say('sheet-relief-measured'), measure.measuredInTheRoundFactor, {
      ...factor,
      name: ['relief_measured_in_the_round'],
    }),
    finish: byKey(finishes, (finish) =>
      write(words.say('sheet-finish', { finish }), buildUps.finishFactors[finish], {
        ...factor,
        name: ['finish', finish],
      }),
    ),
    smoothing: byKey(finishes, (finish) =>
      write(words.say('sheet-smoothing', { finish }), buildUps.smoothingFactors[finish], {
        ...factor,
        name: ['smoothing', finish],
      }),
    ),
    spread: write(words.say('sheet-spread'), buildUps.spread.likely, { ...factor, name: ['hands_on_likely'] }),
  };
}

function layingRates(write: Write, { snapshot, words: { say } }: WorkbookFacts) {
  const { laying } = snapshot.card.buildUps;
  const minutes = (way: 'sheets' | 'lays' | 'patches' | 'ribbon', value: number) =>
    write(say('sheet-laying', { way }), value, { unit: say('sheet-unit-minutes'), name: ['laying', way, 'minutes'] });
  return {
    laying: {
      sheets: minutes('sheets', laying.sheets_minutes),
      lays: minutes('lays', laying.lays_minutes),
      patches: minutes('patches', laying.patches_minutes),
      ribbon: minutes('ribbon', laying.ribbon_minutes_m),
    },
    onSize: write(say('sheet-on-size'), laying.onSizeFactor, { unit: '×', name: ['laying_on_size'] }),
    transferFlat: write(say('sheet-transfer-flat'), laying.transferFlatFactor, { unit: '×', name: ['transfer_flat'] }),
    transferCarved: write(say('sheet-transfer-carved'), laying.transferCarvedFactor, {
      unit: '×',
      name: ['transfer_carved'],
    }),
  };
}

function otherRates(write: Write, { snapshot, words: { say } }: WorkbookFacts) {
  const card = snapshot.card.buildUps;
  const perArea = say('sheet-unit-hours-a-square-metre');
  const hours = say('sheet-unit-hours');
  return {
    painted: write(say('sheet-painted'), card.paintedOrnament_hours_dm2.likely, {
      unit: say('sheet-unit-hours-a-square-decimetre'),
      name: ['painted_hours_dm2'],
    }),
    consolidating: write(say('sheet-consolidating'), card.consolidating_hours_m2.likely, {
      unit: perArea,
      name: ['consolidating_hours_m2'],
    }),
    cleaning: write(say('sheet-cleaning'), card.cleaning_hours_m2.likely, {
      unit: perArea,
      name: ['cleaning_hours_m2'],
    }),
    edge: write(say('sheet-edge'), card.protectingEdge_hours_m, {
      unit: say('sheet-unit-hours-a-metre'),
      name: ['edge_hours_m'],
    }),
    setUp: write(say('sheet-set-up'), card.setUp_hours, { unit: hours, name: ['set_up_hours'] }),
    workingDay: write(say('sheet-working-day'), card.workingDay_hours, { unit: hours, name: ['working_day_hours'] }),
    productive: write(say('sheet-productive'), card.productiveShare_percent, {
      unit: '%',
      name: ['productive_percent'],
    }),
    burnished: write(say('sheet-burnished'), card.burnished_percent, { unit: '%', name: ['burnished_percent'] }),
  };
}

/** Writes the part of the card that turns areas and leaves into hands-on hours. */
export function gildingRates(rates: RatesSheet, facts: WorkbookFacts): GildingRates {
  const write: Write = (label, value, at) => rates.rate({ label, value, ...at });
  rates.part(facts.words.say('sheet-rates-gilding'));
  const plain = { ...factorRates(write, facts), ...layingRates(write, facts), ...otherRates(write, facts) };
  return { ...plain, step: stepRates(rates, facts) };
}
