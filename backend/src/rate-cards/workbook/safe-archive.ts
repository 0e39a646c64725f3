import { inflateRawSync } from 'node:zlib';
import { Rejection } from '#shared/problems/rejection';

/** What an entry of a ZIP archive says of itself in the directory at the end (APPNOTE 6.3.10, 4.3.12). */
interface Entry {
  readonly name: string;
  readonly flags: number;
  readonly method: number;
  readonly packed_bytes: number;
  readonly whole_bytes: number;
  readonly at: number;
}

const mostEntries = 200;
const most_bytes = 16 * 1024 * 1024;

const marks = { end: 0x06054b50, directory: 0x02014b50, local: 0x04034b50 } as const;
const lengths = { end: 22, directory: 46, local: 30, longestComment: 0xffff } as const;
const [stored, deflated] = [0, 8];
const isEncrypted = 1;

const notAWorkbook = (): Rejection => new Rejection('unsupported', 'workbook-not-xlsx');
const tooLarge = (): Rejection => new Rejection('too-large', 'workbook-too-large');

/** Where the directory ends: the last such mark whose comment reaches to the end of the file. */
function endOf(bytes: Buffer): number {
  const first = Math.max(0, bytes.length - lengths.end - lengths.longestComment);
  for (let at = bytes.length - lengths.end; at >= first; at--) {
    if (bytes.readUInt32LE(at) === marks.end && at + lengths.end + bytes.readUInt16LE(at + 20) === bytes.length)
      return at;
  }
  throw notAWorkbook();
}

function entryAt(bytes: Buffer, at: number): { entry: Entry; next: number } {
  if (bytes.readUInt32LE(at) !== marks.directory) throw notAWorkbook();
  const name = at + lengths.directory;
  const nameEnd = name + bytes.readUInt16LE(at + 28);
  const entry = {
    name: bytes.toString('utf8', name, nameEnd),
    flags: bytes.readUInt16LE(at + 8),
    method: bytes.readUInt16LE(at + 10),
    packed_bytes: bytes.readUInt32LE(at + 20),
    whole_bytes: bytes.readUInt32LE(at + 24),
    at: bytes.readUInt32LE(at + 42),
  };
  return { entry, next: nameEnd + bytes.readUInt16LE(at + 30) + bytes.readUInt16LE(at + 32) };
}

/** The directory has to end where the end says: an archive hidden behind another file is no workbook. */
function directoryOf(bytes: Buffer): Entry[] {
  const end = endOf(bytes);
  const count = bytes.readUInt16LE(end + 10);
  let at = bytes.readUInt32LE(end + 16);
  if (count > mostEntries) throw tooLarge();
  const entries = Array.from({ length: count }, () => {
    const { entry, next } = entryAt(bytes, at);
    at = next;
    return entry;
  });
  if (at !== end) throw notAWorkbook();
  return entries;
}

/** What was packed has to be as large as declared: it is unpacked no further than that. */
function checkSize(bytes: Buffer, { at, method, packed_bytes, whole_bytes }: Entry): void {
  if (bytes.readUInt32LE(at) !== marks.local) throw notAWorkbook();
  const start = at + lengths.local + bytes.readUInt16LE(at + 26) + bytes.readUInt16LE(at + 28);
  const packed = bytes.subarray(start, start + packed_bytes);
  const size =
    method === stored ? packed.length : inflateRawSync(packed, { maxOutputLength: Math.max(1, whole_bytes) }).length;
  if (size !== whole_bytes) throw notAWorkbook();
}

function checkEntries(bytes: Buffer, entries: readonly Entry[]): void {
  if (entries.reduce((sum, { whole_bytes }) => sum + whole_bytes, 0) > most_bytes) throw tooLarge();
  const isPlain = ({ flags, method }: Entry) => (flags & isEncrypted) === 0 && [stored, deflated].includes(method);
  if (!entries.every(isPlain)) throw notAWorkbook();
  if (!entries.some(({ name }) => name === 'xl/workbook.xml')) throw notAWorkbook();
  for (const entry of entries) checkSize(bytes, entry);
}

/** Refuses what is no workbook, what says it would be too large before anything is unpacked, and what is larger than it says. */
export function refuseUnsafeArchive(bytes: Buffer): void {
  try {
    checkEntries(bytes, directoryOf(bytes));
  } catch (error) {
    if (error instanceof Rejection) throw error;
    // A length or offset that leads out of the file, or data that cannot be unpacked.
    throw notAWorkbook();
  }
}
