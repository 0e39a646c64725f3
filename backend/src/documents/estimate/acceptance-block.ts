import type { Block, Flow } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { paperColours, textStyles } from '../paper/paper-colours';
import { sectionBlocks } from '../paper/section-blocks';
import { textBlock, widthOf } from '../paper/text-block';
import { writeLine } from '../paper/text-lines';
import type { IssueContent } from './issue-content';
import { paperNames } from './paper-names';

const gap_pt = 30;
const signing_pt = 46;

function drawSigning(flow: Flow, labels: readonly string[]): void {
  const width_pt = (widthOf(flow.pdf) - gap_pt) / 2;
  const y_pt = flow.y + signing_pt - 14;
  labels.forEach((label, place) => {
    const x_pt = flow.left + place * (width_pt + gap_pt);
    flow.artifact(() =>
      flow.pdf
        .lineWidth(0.6)
        .strokeColor(paperColours.muted)
        .moveTo(x_pt, y_pt)
        .lineTo(x_pt + width_pt, y_pt)
        .stroke(),
    );
    flow.tagged('P', () => writeLine(flow.pdf, label, { style: textStyles.note, place: { x_pt, y_pt: y_pt + 2 } }));
  });
  flow.y += signing_pt;
}

/** Where a client signs, all on one page. */
export function acceptanceBlocks(pdf: Pdf, { snapshot, words }: IssueContent): Block[] {
  const text = textBlock(pdf, paperNames(snapshot, words).acceptance);
  const labels = [words.say('paper-acceptance-place'), words.say('paper-acceptance-name')];
  const whole: Block = {
    lead_pt: text.lead_pt + signing_pt,
    place: (flow) => {
      text.place(flow);
      drawSigning(flow, labels);
    },
  };
  return sectionBlocks(pdf, words.say('paper-acceptance'), [whole]);
}
