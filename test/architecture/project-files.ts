import { readdirSync, readFileSync } from 'node:fs';
import * as path from 'node:path';
import { projectRoot } from './project-root';

/** What is made or installed rather than written. */
const made = new Set(['node_modules', 'dist', 'data', 'coverage', 'screenshots', '.angular', '.cache', '.git']);

/** Every written file below these folders of the project, by its path in the project, in order. */
export function projectFiles(folders: readonly string[], isWanted: (file: string) => boolean): string[] {
  const below = (folder: string): string[] =>
    readdirSync(path.join(projectRoot, folder), { withFileTypes: true }).flatMap((entry) => {
      const name = path.posix.join(folder, entry.name);
      if (made.has(entry.name)) return [];
      return entry.isDirectory() ? below(name) : [name];
    });
  return folders.flatMap(below).filter(isWanted).sort();
}

/** The text of one of them. */
export const textOf = (file: string): string => readFileSync(path.join(projectRoot, file), 'utf8');

export const isTypeScript = (file: string): boolean => file.endsWith('.ts');
export const isSpec = (file: string): boolean => file.endsWith('.spec.ts');

/** The code that runs, on all three sides. */
export const productFiles = (): string[] =>
  projectFiles(['shared', 'backend', 'frontend/src', 'seeders'], (file) => isTypeScript(file) && !isSpec(file));
