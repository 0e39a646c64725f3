import { Flow, type Block } from './flow';
import { closedPaper, openPaper, type PaperFacts, type Pdf } from './open-paper';
import { writePageFeet, type PageFeet } from './page-feet';
import { placeBlocks } from './section-blocks';

/** A paper to be made: what it is, what its pages bear, and what stands on it, worked once its fonts are open. */
export interface PaperPlan {
  readonly facts: PaperFacts;
  readonly feet: PageFeet;
  readonly blocks: (pdf: Pdf) => readonly Block[];
}

/** Sets a paper and gives its bytes; the same plan gives the same bytes. */
export function finishedPaper({ facts, feet, blocks }: PaperPlan): Promise<Buffer> {
  const pdf = openPaper(facts);
  const flow = new Flow(pdf);
  placeBlocks(flow, blocks(pdf));
  flow.end();
  writePageFeet(pdf, feet);
  return closedPaper(pdf);
}
