import type { Block, Flow } from './flow';
import type { Pdf } from './open-paper';
import { textStyles, type TextStyle } from './paper-colours';
import { textBlock } from './text-block';

interface HeadingSetting {
  readonly tag: 'H2' | 'H3';
  readonly style: TextStyle;
  readonly before_pt: number;
  readonly after_pt: number;
}

/** A heading that never stands at the foot of a page without the beginning of what it is over. */
function headingOver(pdf: Pdf, text: string, { next, ...setting }: HeadingSetting & { readonly next: Block }): Block {
  const own = textBlock(pdf, text, setting);
  const lead_pt = own.lead_pt + setting.after_pt + next.lead_pt;
  return {
    lead_pt,
    place: (flow) => {
      flow.need(Math.min(lead_pt, flow.pageHeight));
      own.place(flow);
      flow.y += setting.after_pt;
    },
  };
}

const section = { tag: 'H2', style: textStyles.heading, before_pt: 20, after_pt: 5 } as const;
const part = { tag: 'H3', style: textStyles.subheading, before_pt: 11, after_pt: 2 } as const;

/** A part of a section with its smaller heading; the first block stays with it. */
export function partBlocks(pdf: Pdf, heading: string, blocks: readonly Block[]): Block[] {
  return blocks.length === 0 ? [] : [headingOver(pdf, heading, { ...part, next: blocks[0] }), ...blocks];
}

/** A heading with what stands under it; nothing at all where there is nothing to stand there. */
export function sectionBlocks(pdf: Pdf, heading: string, blocks: readonly Block[]): Block[] {
  return blocks.length === 0 ? [] : [headingOver(pdf, heading, { ...section, next: blocks[0] }), ...blocks];
}

/** Sets blocks one after another, each where its beginning fits. */
export function placeBlocks(flow: Flow, blocks: readonly Block[]): void {
  for (const block of blocks) {
    flow.need(Math.min(block.lead_pt, flow.pageHeight));
    block.place(flow);
  }
}
