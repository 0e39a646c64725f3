import { cpSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import * as path from 'node:path';
import { projectRoot } from './project-root';

/** Files by their path in the project, with their text. */
export type PlantedFiles = Readonly<Record<string, string>>;

/** A project of the same layout somewhere else, to break rules in. */
export interface PlantedTree {
  readonly folder: string;
  readonly remove: () => void;
}

/** Lays out a temporary project: `copied` paths of this one (the rules under test), and the planted files. */
export function plantedTree(copied: readonly string[], files: PlantedFiles): PlantedTree {
  const folder = mkdtempSync(path.join(tmpdir(), 'planted-'));
  for (const name of copied) {
    cpSync(path.join(projectRoot, name), path.join(folder, name), { recursive: true });
  }
  for (const [name, text] of Object.entries(files)) {
    const target = path.join(folder, name);
    mkdirSync(path.dirname(target), { recursive: true });
    writeFileSync(target, text);
  }
  return { folder, remove: () => rmSync(folder, { recursive: true, force: true }) };
}
