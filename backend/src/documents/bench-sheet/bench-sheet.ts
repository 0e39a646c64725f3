import type { FindingKind } from '#shared/words/finding';
import type { WordCode } from '#shared/words/word-code';
import { addressBlock } from '../address-block';
import type { BenchSheetRequest } from '../../estimates';
import { finishedPaper } from '../paper/finished-paper';
import type { Block } from '../paper/flow';
import { listBlock } from '../paper/list-blocks';
import type { Pdf } from '../paper/open-paper';
import { textStyles } from '../paper/paper-colours';
import { sectionBlocks } from '../paper/section-blocks';
import { textBlock } from '../paper/text-block';
import { benchContent, type BenchContent } from './bench-content';
import { lotBlocks } from './lot-blocks';
import { memberBlocks } from './member-blocks';

/** Findings that say one thing of several steps, put together; each sentence once, and whom to ask last. */
function toldOnce({ findings, words }: BenchContent, kinds: readonly FindingKind[]): string[] {
  const own = findings.filter((finding) => kinds.includes(finding.kind));
  const stepsOf = (code: string) =>
    own.flatMap(({ code: other, values }) => (other === code ? String(values['steps'] ?? '').split(', ') : []));
  const texts = own.map(({ code, values }) => ({
    code,
    text: words.say(code, 'steps' in values ? { ...values, steps: [...new Set(stepsOf(code))].join(', ') } : values),
  }));
  const inOrder = [false, true].flatMap((isLast) => texts.filter(({ code }) => (code === 'caution-defer') === isLast));
  return [...new Set(inOrder.map(({ text }) => text))];
}

function told(pdf: Pdf, content: BenchContent, [heading, ...kinds]: readonly [WordCode, ...FindingKind[]]): Block[] {
  const texts = toldOnce(content, kinds);
  return texts.length === 0 ? [] : sectionBlocks(pdf, content.words.say(heading), [listBlock(pdf, texts)]);
}

function benchBlocks(pdf: Pdf, content: BenchContent): Block[] {
  const { request, words, piece } = content;
  const { job, draft, madeOn } = request;
  return [
    textBlock(pdf, piece.name, { style: textStyles.title, tag: 'H1' }),
    addressBlock(pdf, {
      address: [draft.settings.title],
      particulars: [
        [words.say('paper-job'), [job.number, job.title].filter(Boolean).join(', ')],
        [words.say('bench-as-on'), words.day(madeOn)],
      ],
    }),
    ...(piece.note.trim() === '' ? [] : [textBlock(pdf, piece.note)]),
    ...told(pdf, content, ['bench-cautions', 'caution']),
    ...lotBlocks(pdf, content),
    ...memberBlocks(pdf, content),
    ...told(pdf, content, ['bench-notes', 'refuse', 'missing', 'warn', 'note']),
  ];
}

/** What the bench needs to know of one piece, as a paper without any price; RangeError for a piece the draft does not hold. */
export function benchSheet(request: BenchSheetRequest): Promise<Buffer> {
  const content = benchContent(request);
  const { words, piece } = content;
  const { workshop, job } = request;
  const title = words.say('bench-title', { piece: piece.name });
  const head = [title, job.number].filter(Boolean).join(' · ');
  return finishedPaper({
    facts: {
      title,
      author: workshop.name,
      subject: [job.number, job.title].filter(Boolean).join(', '),
      language: words.language,
      size: workshop.paperSize === 'Letter' ? 'Letter' : 'A4',
      madeAt: request.madeAt,
    },
    feet: {
      head,
      foot: `${workshop.name} · ${head}`,
      pageOf: (page, pages) => words.say('paper-page-of', { page, pages }),
    },
    blocks: (pdf) => benchBlocks(pdf, content),
  });
}
