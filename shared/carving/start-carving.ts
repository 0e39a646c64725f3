import type { CarvingCard } from '#shared/carving/carving-card';
import { startCarvingItems, startOrnaments } from '#shared/carving/start-ornaments';
import { startTimbers } from '#shared/carving/start-timbers';

/** The carving part a workshop starts from: invented house values, every one to be changed at the bench. */
export const startCarving: CarvingCard = {
  ornaments: startOrnaments,
  items: startCarvingItems,
  timbers: startTimbers,
  reliefFactors: { flat: 0.6, low: 0.8, middle: 1, high: 1.35, pierced: 1.5, 'in-the-round': 1.8 },
  undercut_percent: 20,
  planFactors: { straight: 1, 'flat-sweep': 1.1, 'quick-sweep': 1.25 },
  // Plain work circular on plan: half as much again on a flat sweep, double on a quick one (19th-century builder's price list, p. 638).
  blankPlanFactors: { straight: 1, 'flat-sweep': 1.5, 'quick-sweep': 2 },
  sizeExponent: 1.4,
  learning: { model: 'unit', rate_percent: 92, plateauPieces: 16, plateauRunning: 64 },
  stretchTolerance_percent: 5,
  stages: [
    { id: 'marking-out', name: 'Marking out', share_hundredths: 300, gradeId: 'carver' },
    { id: 'blank', name: 'Blank', share_hundredths: 1000, gradeId: 'improver' },
    { id: 'setting-in', name: 'Setting in', share_hundredths: 1300, gradeId: 'carver' },
    { id: 'grounding', name: 'Grounding', share_hundredths: 1200, gradeId: 'improver' },
    { id: 'bosting', name: 'Bosting', share_hundredths: 2200, gradeId: 'carver' },
    { id: 'modelling', name: 'Modelling', share_hundredths: 2200, gradeId: 'master-carver' },
    { id: 'detail', name: 'Detail', share_hundredths: 1300, gradeId: 'master-carver' },
    { id: 'cleaning-up', name: 'Cleaning up', share_hundredths: 500, gradeId: 'carver' },
  ],
  undercuttingGradeId: 'master-carver',
  patternGradeId: 'carver',
  sharpening_percent: 10,
  recutting: {
    plain: { share_percent: 15, hours_per_m2: 8 },
    french: { share_percent: 35, hours_per_m2: 20 },
    gradeId: 'carver',
  },
};
