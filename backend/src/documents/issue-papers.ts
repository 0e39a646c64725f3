import { leafNeeds } from '#shared/documents/leaf-needs';
import { leafOrderLines } from '#shared/documents/leaf-order-lines';
import type { Paper } from '#shared/estimates/issue-schema';
import type { Snapshot } from '#shared/estimates/snapshot';
import { currencyDigits } from '#shared/money/currency-digits';
import { estimatePaper } from './estimate/estimate-paper';
import { fileName } from './file-names';
import type { PaperFile } from '../estimates';
import { leafOrderList } from './leaf-order/leaf-order-list';
import { leafOrderPaper } from './leaf-order/leaf-order-paper';
import { paperWords } from './paper-words';
import { estimateWorkbook } from './workbook/estimate-workbook';

const media: Readonly<Record<Paper, string>> = {
  'estimate.pdf': 'application/pdf',
  'estimate.xlsx': 'application/vnd.openxmlformats-officedocument.spreadsheetml.sheet',
  'leaf-order.pdf': 'application/pdf',
  'leaf-order.csv': 'text/csv; charset=utf-8',
};

const orderLines = (snapshot: Snapshot) =>
  leafOrderLines(leafNeeds(snapshot), {
    card: snapshot.card.leaf,
    digits: currencyDigits(snapshot.workshop.currency),
  });

/** How each paper is set; nothing is worked for one that is not asked for. */
const setters: Readonly<Record<Paper, (snapshot: Snapshot, logo: Buffer | null) => Promise<Buffer> | Buffer>> = {
  'estimate.pdf': (snapshot, logo) => estimatePaper(snapshot, logo),
  'estimate.xlsx': (snapshot) => estimateWorkbook(snapshot),
  'leaf-order.pdf': (snapshot, logo) => leafOrderPaper(snapshot, { lines: orderLines(snapshot), logo }),
  'leaf-order.csv': (snapshot) => {
    const { currency } = snapshot.workshop;
    const words = paperWords(snapshot.workshop);
    return leafOrderList(orderLines(snapshot), { words, currency, digits: currencyDigits(currency) });
  },
};

function paperFile({ estimate, varies }: Snapshot, paper: Paper, bytes: Buffer): PaperFile {
  const [kind, ending] = paper.split('.');
  const name = fileName([varies && kind === 'estimate' ? 'variation' : kind, estimate.number, estimate.letter], ending);
  return { paper, name, media: media[paper], bytes };
}

/**
 * One paper of an issue, from nothing but the issue and the picture of the letterhead (PNG or JPEG): no clock, no chance, equal bytes for
 * equal content. The workbook and the leaf order show what things cost, and are not for clients.
 */
export const issuePaper = async (snapshot: Snapshot, logo: Buffer | null, paper: Paper): Promise<PaperFile> =>
  paperFile(snapshot, paper, await setters[paper](snapshot, logo));

/** All papers of an issue. */
export async function issuePapers(snapshot: Snapshot, logo: Buffer | null): Promise<PaperFile[]> {
  const papers: PaperFile[] = [];
  for (const paper of Object.keys(media) as Paper[]) papers.push(await issuePaper(snapshot, logo, paper));
  return papers;
}
