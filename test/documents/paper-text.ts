import { execFileSync } from 'node:child_process';
import { mkdirSync, mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join, resolve } from 'node:path';

function kept(pdf: Buffer): string {
  const path = join(mkdtempSync(join(tmpdir(), 'paper-')), 'paper.pdf');
  writeFileSync(path, pdf);
  return path;
}

/** The text of a paper as poppler reads it, one page after another, set as it stands on the page. */
export const pagesOf = (pdf: Buffer): string[] =>
  execFileSync('pdftotext', ['-layout', kept(pdf), '-'], { encoding: 'utf8' })
    .split('\f')
    .slice(0, -1);

/** The whole text with its lines joined, so that a sentence is found however it was broken. */
export const textOfPaper = (pdf: Buffer): string => pagesOf(pdf).join(' ').replace(/\s+/g, ' ');

/** What poppler tells of a paper: title, size, whether it is tagged. */
export const factsOf = (pdf: Buffer): string => execFileSync('pdfinfo', ['-isodates', kept(pdf)], { encoding: 'utf8' });

/** The tree of tags with what stands under each. */
export const tagsOf = (pdf: Buffer): string =>
  execFileSync('pdfinfo', ['-struct-text', kept(pdf)], { encoding: 'utf8' });

/** Leaves a paper where it can be looked at; the folder is ignored. */
export function leaveSample(name: string, bytes: Buffer): void {
  const folder = resolve(__dirname, '../../.cache/papers');
  mkdirSync(folder, { recursive: true });
  writeFileSync(join(folder, name), bytes);
}
