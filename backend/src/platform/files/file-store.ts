import { createHash, randomUUID } from 'node:crypto';
import { mkdir, open, readdir, readFile, rename, rm, stat, utimes } from 'node:fs/promises';
import { basename, dirname, join } from 'node:path';
import { v7 as newId } from 'uuid';
import { Rejection } from '#shared/problems/rejection';
import type { Clock } from '../clock/clock';
import { column } from '../database/columns';
import type { Database } from '../database/database';
import { WorkshopRows, type WorkshopRow } from '../database/workshop-rows';

/** A row that names a file; the bytes lie in the data folder under their SHA-256. */
export interface FileRow extends WorkshopRow {
  readonly sha256: string;
  readonly name: string;
  readonly media: string;
  readonly size_bytes: number;
  readonly createdAt: Date;
}

export interface NewFile {
  readonly name: string;
  readonly media: string;
  readonly bytes: Buffer;
}

export interface StoredFile extends FileRow {
  readonly bytes: Buffer;
}

const orphanAge_milliseconds = 3_600_000;

async function writeThrough(path: string, bytes: Buffer): Promise<void> {
  const file = await open(path, 'wx', 0o600);
  try {
    await file.writeFile(bytes);
    await file.sync();
  } finally {
    await file.close();
  }
}

async function syncFolder(path: string): Promise<void> {
  const folder = await open(path, 'r');
  try {
    await folder.sync();
  } finally {
    await folder.close();
  }
}

const names = (folder: string): Promise<string[]> => readdir(folder).catch(() => []);

/**
 * Files of the workshops, each under its content's SHA-256 in a folder of its workshop. The bytes are on the disk before the row
 * that names them is committed; they are read only through such a row; bytes no row names are swept away after an hour.
 */
export class FileStore {
  private readonly rows: WorkshopRows<FileRow>;

  constructor(
    private readonly database: Database,
    private readonly folder: string,
    private readonly clock: Clock,
  ) {
    this.rows = new WorkshopRows(
      database.table<FileRow>('files', {
        id: column.id,
        workshopId: column.workshopId,
        sha256: column.word,
        name: column.word,
        media: column.word,
        size_bytes: column.whole,
        createdAt: column.instant,
      }),
    );
  }

  async save(workshopId: string, file: NewFile): Promise<FileRow> {
    const sha256 = createHash('sha256').update(file.bytes).digest('hex');
    await this.keep(this.pathOf(workshopId, sha256), file.bytes);
    return this.rows.insert(workshopId, {
      id: newId(),
      sha256,
      name: file.name,
      media: file.media,
      size_bytes: file.bytes.length,
      createdAt: this.clock.now(),
    });
  }

  find(workshopId: string, id: string): Promise<FileRow | undefined> {
    return this.rows.find(workshopId, id);
  }

  /** The file with its bytes; refused as not found when this workshop has no such row. */
  async read(workshopId: string, id: string): Promise<StoredFile> {
    const row = await this.rows.get(workshopId, id);
    const bytes = await readFile(this.pathOf(workshopId, row.sha256));
    if (createHash('sha256').update(bytes).digest('hex') !== row.sha256) throw new Error(`file ${id} is damaged`);
    return { ...row, bytes };
  }

  async remove(workshopId: string, id: string): Promise<void> {
    if (!(await this.rows.remove(workshopId, id))) throw new Rejection('not-found', 'problem-not-found');
  }

  /** Deletes bytes older than an hour that no row names; answers how many files went. */
  async sweep(): Promise<number> {
    let swept = 0;
    for (const workshopId of await names(this.folder)) {
      for (const shelf of await names(join(this.folder, workshopId))) {
        const folder = join(this.folder, workshopId, shelf);
        for (const name of await names(folder)) swept += (await this.sweepOne(workshopId, join(folder, name))) ? 1 : 0;
      }
    }
    return swept;
  }

  private pathOf(workshopId: string, sha256: string): string {
    return join(this.folder, workshopId, sha256.slice(0, 2), sha256);
  }

  /** Bytes that lie there already are made young again, so that no sweep takes them before their new row is committed. */
  private async keep(path: string, bytes: Buffer): Promise<void> {
    const now = this.clock.now();
    if (
      await utimes(path, now, now).then(
        () => true,
        () => false,
      )
    )
      return;
    const folder = dirname(path);
    await mkdir(folder, { recursive: true, mode: 0o700 });
    const making = join(folder, `${randomUUID()}.making`);
    await writeThrough(making, bytes);
    await utimes(making, now, now);
    await rename(making, path);
    await syncFolder(folder);
  }

  private async isOld(path: string): Promise<boolean> {
    const found = await stat(path).catch(() => undefined);
    return found !== undefined && this.clock.now().getTime() - found.mtimeMs >= orphanAge_milliseconds;
  }

  private async sweepOne(workshopId: string, path: string): Promise<boolean> {
    if (!(await this.isOld(path))) return false;
    const named = await this.rows.list(workshopId, { where: { sha256: basename(path) }, limit: 1 });
    if (named.length > 0 || !(await this.isOld(path))) return false;
    await rm(path, { force: true });
    return true;
  }
}
