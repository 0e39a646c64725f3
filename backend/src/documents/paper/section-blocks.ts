import type { Block, Flow } from './flow';
import type { Pdf } from './open-paper';
import { textStyles } from './paper-look';
import { textBlock } from './text-block';

/** A heading that never stands at the foot of a page without the beginning of what it is over. */
export function headingBlock(pdf: Pdf, text: string, next?: Block, level: 'H2' | 'H3' = 'H2'): Block {
  const style = level === 'H2' ? textStyles.heading : textStyles.subheading;
  const [before_pt, after_pt] = level === 'H2' ? [20, 5] : [11, 2];
  const own = textBlock(pdf, text, { style, before_pt, tag: level });
  const lead_pt = own.lead_pt + after_pt + (next?.lead_pt ?? 0);
  return {
    lead_pt,
    place: (flow) => {
      flow.need(Math.min(lead_pt, flow.pageHeight));
      own.place(flow);
      flow.y += after_pt;
    },
  };
}

/** A heading with what stands under it; nothing at all where there is nothing to stand there. */
export function sectionBlocks(pdf: Pdf, heading: string, blocks: readonly Block[]): Block[] {
  return blocks.length === 0 ? [] : [headingBlock(pdf, heading, blocks[0]), ...blocks];
}

/** Sets blocks one after another, each where its beginning fits. */
export function placeBlocks(flow: Flow, blocks: readonly Block[]): void {
  for (const block of blocks) {
    flow.need(Math.min(block.lead_pt, flow.pageHeight));
    block.place(flow);
  }
}
