import type { LaysLaying } from '#shared/leaf/lays-laying';
import type { PatchesLaying } from '#shared/leaf/patches-laying';
import type { RibbonLaying } from '#shared/leaf/ribbon-laying';
import type { SheetField, SheetsLaying } from '#shared/leaf/sheets-laying';
import type { Laying } from '#shared/leaf/laying';
import type { Reason } from '#shared/words/reason';

const ofField = (field: SheetField, step_mm: number): Reason[] => {
  const { length_mm, height_mm, leavesAlong, fullCourses, strip_mm, stripsPerLeaf, direction } = field;
  const sizes = direction === 'along' ? { length_mm, height_mm } : { length_mm: height_mm, height_mm: length_mm };
  const strip = { strip_mm, strips: stripsPerLeaf, along: leavesAlong };
  const stripLeaves = leavesAlong / stripsPerLeaf;
  if (fullCourses === 0 && strip_mm > 0)
    return [{ code: 'leaf-narrow-strip', values: { ...sizes, ...strip }, figure: stripLeaves, unit: 'number' }];
  const courses: Reason = {
    code: 'leaf-courses',
    values: { ...sizes, courses: fullCourses, along: leavesAlong, step_mm },
    figure: fullCourses * leavesAlong,
    unit: 'number',
  };
  if (strip_mm === 0) return [courses];
  return [courses, { code: 'leaf-last-strip', values: strip, figure: stripLeaves, unit: 'number' }];
};

function ofSheets({ fields, rest_mm2, step_mm }: SheetsLaying): Reason[] {
  const rest: Reason = {
    code: 'leaf-by-area',
    values: { area_mm2: rest_mm2, step_mm },
    figure: rest_mm2 / step_mm ** 2,
    unit: 'number',
  };
  return [...fields.flatMap((field) => ofField(field, step_mm)), ...(rest_mm2 > 0 ? [rest] : [])];
}

function ofLays({ chosen, run_mm, girth_mm, lap_mm, step_mm, small, leaves }: LaysLaying): Reason[] {
  if (small) {
    return [{ code: 'leaf-small-pieces', values: { girth_mm, run_mm, ...small }, figure: leaves, unit: 'number' }];
  }
  const across_mm = chosen.strip_mm - lap_mm;
  return [
    { code: 'leaf-pieces-along', values: { run_mm, step_mm }, figure: chosen.piecesAlong, unit: 'number' },
    { code: 'leaf-lays-across', values: { girth_mm, step_mm: across_mm }, figure: chosen.laysAcross, unit: 'number' },
    { code: 'leaf-strips', values: { strips: chosen.strips }, figure: leaves, unit: 'number' },
  ];
}

const ofPatches = ({ area_mm2, cuts, covered_mm, leaves }: PatchesLaying): Reason[] => [
  { code: 'leaf-patches', values: { area_mm2, cuts, step_mm: covered_mm }, figure: leaves, unit: 'number' },
];

const ofRibbon = ({ length_mm, leaves, pieces }: RibbonLaying): Reason[] => [
  { code: 'leaf-ribbon', values: { length_mm, pieces }, figure: leaves, unit: 'number' },
];

/** How the leaf of one member was counted, step by step, before share and relief. */
export function layingReasons(laying: Laying): Reason[] {
  switch (laying.way) {
    case 'sheets':
      return ofSheets(laying);
    case 'lays':
      return ofLays(laying);
    case 'patches':
      return ofPatches(laying);
    case 'ribbon':
      return ofRibbon(laying);
  }
}
