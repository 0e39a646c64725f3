import { laidField } from '#shared/leaf/laid-field';
import type { LayingWay } from '#shared/leaf/leaf-card';
import { smallFace } from '#shared/leaf/small-face';
import type { ZoneLeafInput } from '#shared/leaf/zone-leaf-input';
import type { Surface } from '#shared/measure/surface';

/** All that decides how leaf is proposed to be laid. */
type Proposal = Pick<ZoneLeafInput, 'surface' | 'partKeys' | 'relief' | 'finish' | 'members'>;

/** A field is narrow while it is less than so many leaves wide. */
const narrowLeaves = 2;

const isMoulding = ({ laying, finish }: Surface): boolean => laying === 'lays' && finish === 'moulded';

// Leaf follows a carved moulding in lays (egg and dart is laid along), but it is cut small for openwork and figures.
function isPatched({ relief, finish, surface }: Proposal): boolean {
  if (surface.laying === 'patches' || relief === 'pierced' || relief === 'in-the-round') return true;
  const isCarved = relief !== 'flat' || finish === 'carved';
  return isCarved && !isMoulding(surface);
}

function isNarrow(proposal: Proposal, side_mm: number): boolean {
  if (smallFace(proposal, side_mm)) return true;
  const { moulding } = laidField(proposal);
  return moulding !== null && moulding.girth_mm < narrowLeaves * side_mm * (1 - 1e-9);
}

/**
 * How leaf of a side (mm) is proposed to be laid on a zone: in patches on carved relief and in the round, in lays on mouldings, on anything less
 * than two leaves wide and on small faces alike, else in sheets. Common practice, no source.
 */
export function proposedWay(proposal: Proposal, side_mm: number): LayingWay {
  if (isPatched(proposal)) return 'patches';
  return proposal.surface.laying === 'sheets' && isNarrow(proposal, side_mm) ? 'lays' : proposal.surface.laying;
}
