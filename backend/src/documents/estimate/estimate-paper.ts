import type { Snapshot } from '#shared/estimates/snapshot';
import { addressBlock } from '../address-block';
import { letterheadBlock, printableLogo } from '../letterhead';
import { finishedPaper } from '../paper/finished-paper';
import type { Block } from '../paper/flow';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { sectionBlocks } from '../paper/section-blocks';
import { textBlock } from '../paper/text-block';
import type { WordCode } from '#shared/words/word-code';
import { acceptanceBlocks } from './acceptance-block';
import { careBlocks, cautionBlocks } from './care-blocks';
import { alternativesBlocks } from './alternatives-blocks';
import { buildUpBlocks, memberDrawingBlocks } from './drawing-blocks';
import { holdingBlocks } from './holding-blocks';
import { issueContent, type IssueContent } from './issue-content';
import { paperNames, titleOf } from './paper-names';
import { paymentBlocks } from './payment-blocks';
import { priceTable } from './price-table';
import { programmeBlocks } from './programme-blocks';
import { scopeBlocks } from './scope-blocks';
import { timeBlocks } from './time-blocks';

function addressOf(pdf: Pdf, { snapshot, words, taxed }: IssueContent): Block {
  const { client, job, issuedOn, validUntil, issuedBy, estimate, figures } = snapshot;
  const { kind, varies } = paperNames(snapshot, words);
  const { gross_minor: total_minor } = figures.price;
  return addressBlock(pdf, {
    address: [client.name, client.contact, client.address],
    particulars: [
      [kind, words.say('paper-number-letter', { ...estimate })],
      [words.say('paper-varies'), varies],
      [words.say('paper-date'), words.day(issuedOn)],
      [words.say('paper-holds-until'), words.day(validUntil)],
      [words.say('paper-job'), [job.number, job.title].filter(Boolean).join(', ')],
      [words.say('paper-reference'), job.reference],
      [words.say('paper-site'), job.site],
      [words.say('paper-issued-by'), issuedBy],
      [words.say('paper-total'), words.say('paper-total-of-all', { total_minor, taxed })],
    ],
  });
}

function textSection(pdf: Pdf, content: IssueContent, [heading, text]: readonly [WordCode, string]): Block[] {
  return text.trim() === '' ? [] : sectionBlocks(pdf, content.words.say(heading), [textBlock(pdf, text)]);
}

function introduction(pdf: Pdf, content: IssueContent): Block[] {
  const texts = [content.draft.settings.introduction, content.snapshot.note].filter((text) => text.trim() !== '');
  return texts.map((text) => textBlock(pdf, text, { before_pt: 6 }));
}

function estimateBlocks(pdf: Pdf, content: IssueContent, logo: Buffer | null): Block[] {
  const { snapshot, draft, words } = content;
  const { terms } = draft.settings;
  return [
    letterheadBlock({ workshop: snapshot.workshop, logo: printableLogo(pdf, logo), words }),
    addressOf(pdf, content),
    textBlock(pdf, titleOf(snapshot), { style: textStyles.title, tag: 'H1' }),
    ...introduction(pdf, content),
    ...sectionBlocks(pdf, words.say('paper-lines'), [priceTable(pdf, content)]),
    ...alternativesBlocks(pdf, content),
    ...scopeBlocks(pdf, content),
    ...timeBlocks(pdf, content),
    ...programmeBlocks(pdf, content),
    ...paymentBlocks(pdf, content),
    ...holdingBlocks(pdf, content),
    ...buildUpBlocks(pdf, content),
    ...memberDrawingBlocks(pdf, content),
    ...careBlocks(pdf, content),
    ...cautionBlocks(pdf, content),
    ...textSection(pdf, content, ['paper-terms', terms]),
    ...acceptanceBlocks(pdf, content),
  ];
}

/** The estimate as its client receives it: prices and never a cost; equal content gives equal bytes. */
export function estimatePaper(snapshot: Snapshot, logo: Buffer | null): Promise<Buffer> {
  const content = issueContent(snapshot);
  const { words } = content;
  const { title, head, subject } = paperNames(snapshot, words);
  return finishedPaper({
    facts: {
      title: head,
      author: snapshot.workshop.name,
      subject,
      language: words.language,
      size: snapshot.workshop.paperSize === 'Letter' ? 'Letter' : 'A4',
      madeAt: snapshot.issuedAt,
    },
    feet: {
      head,
      foot: `${snapshot.workshop.name} · ${title}`,
      pageOf: (page, pages) => words.say('paper-page-of', { page, pages }),
    },
    blocks: (pdf) => estimateBlocks(pdf, content, logo),
  });
}
