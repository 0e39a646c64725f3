import type { LayPlan } from '#shared/leaf/lay-plan';
import type { Figure } from './figure';
import type { Pdf } from './open-paper';
import { paperColours } from './paper-colours';
import { fittingScale } from './view-layout';

/** A lay plan within a box in points, with what it shows in words. */
export interface LayPlanSetting {
  readonly box: { readonly width_pt: number; readonly height_pt: number };
  readonly alt: string;
}

/** The leaves and strips as they lie, to scale; where two overlap the gold is deeper. */
export function layPlanFigure(
  pdf: Pdf,
  plan: LayPlan,
  { box, alt }: LayPlanSetting,
): { figure: Figure; scale: string } {
  const { scale, ratio } = fittingScale(
    (factor) => plan.shownLength_mm * factor <= box.width_pt && plan.shownHeight_mm * factor <= box.height_pt,
  );
  const draw = (x_pt: number, y_pt: number) => {
    pdf.save().lineWidth(0.4).undash().strokeColor(paperColours.ochre).fillColor(paperColours.gold);
    for (const piece of plan.pieces) {
      const [x, y] = [x_pt + piece.x_mm * scale, y_pt + piece.y_mm * scale];
      const [width, height] = [piece.width_mm * scale, piece.height_mm * scale];
      pdf.fillOpacity(0.32).rect(x, y, width, height).fill(paperColours.gold);
      pdf.rect(x, y, width, height).stroke();
    }
    pdf.fillOpacity(1).restore();
  };
  const size = { width_pt: plan.shownLength_mm * scale, height_pt: plan.shownHeight_mm * scale };
  return { figure: { ...size, alt, draw }, scale: `${ratio[0]} : ${ratio[1]}` };
}
