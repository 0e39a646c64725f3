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

async function bytesOf(snapshot: Snapshot, logo: Buffer | null): Promise<Readonly<Record<Paper, Buffer>>> {
  const { card, workshop } = snapshot;
  const digits = currencyDigits(workshop.currency);
  const lines = leafOrderLines(leafNeeds(snapshot), { card: card.leaf, digits });
  const words = paperWords(workshop);
  return {
    'estimate.pdf': await estimatePaper(snapshot, logo),
    'estimate.xlsx': await estimateWorkbook(snapshot),
    'leaf-order.pdf': await leafOrderPaper(snapshot, { lines, logo }),
    'leaf-order.csv': leafOrderList(lines, { words, currency: workshop.currency, digits }),
  };
}

function paperFile({ estimate }: Snapshot, paper: Paper, bytes: Buffer): PaperFile {
  const [kind, ending] = paper.split('.');
  const name = fileName([kind, estimate.number, estimate.letter], ending);
  return { paper, name, media: media[paper], bytes };
}

/**
 * The papers of an issue, from nothing but the issue and the picture of the letterhead (PNG or JPEG): no clock, no chance, equal bytes for
 * equal content. The workbook and the leaf order show what things cost, and are not for clients.
 */
export async function issuePapers(snapshot: Snapshot, logo: Buffer | null): Promise<PaperFile[]> {
  const bytes = await bytesOf(snapshot, logo);
  return (Object.keys(media) as Paper[]).map((paper) => paperFile(snapshot, paper, bytes[paper]));
}

/** The paper of the client alone, as the issue's own would be: byte for byte, where nothing else is chosen. */
export const clientPaper = async (snapshot: Snapshot, logo: Buffer | null): Promise<PaperFile> =>
  paperFile(snapshot, 'estimate.pdf', await estimatePaper(snapshot, logo));
