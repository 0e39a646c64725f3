/**
 * A ZIP archive whose entries all bear one time: the library stamps them with the clock, and equal content has to be equal bytes.
 * Record layouts: PKWARE APPNOTE 6.3.10, 4.3.7 (local header), 4.3.12 (central directory), 4.3.16 (its end), 4.4.6 (date and time).
 */

const endMark = 0x06054b50;
const entryMark = 0x02014b50;
const endLength = 22;

function dosDate(date: Date): { time: number; day: number } {
  const year = Math.max(1980, date.getUTCFullYear()) - 1980;
  return {
    time: (date.getUTCHours() << 11) | (date.getUTCMinutes() << 5) | (date.getUTCSeconds() >> 1),
    day: (year << 9) | ((date.getUTCMonth() + 1) << 5) | date.getUTCDate(),
  };
}

function endOfDirectory(archive: Buffer): number {
  for (let at = archive.length - endLength; at >= 0; at -= 1) if (archive.readUInt32LE(at) === endMark) return at;
  throw new RangeError('this is no ZIP archive');
}

/** The archive with every entry dated the same, in UTC to two seconds; RangeError for what is no ZIP archive. */
export function fixedZipDates(archive: Buffer, date: Date): Buffer {
  const dated = Buffer.from(archive);
  const { time, day } = dosDate(date);
  const stamp = (at: number) => {
    dated.writeUInt16LE(time, at);
    dated.writeUInt16LE(day, at + 2);
  };
  const end = endOfDirectory(dated);
  const entries = dated.readUInt16LE(end + 10);
  let at = dated.readUInt32LE(end + 16);
  for (let entry = 0; entry < entries; entry += 1) {
    if (dated.readUInt32LE(at) !== entryMark) throw new RangeError('this is no ZIP archive');
    stamp(at + 12);
    stamp(dated.readUInt32LE(at + 42) + 10);
    at += 46 + dated.readUInt16LE(at + 28) + dated.readUInt16LE(at + 30) + dated.readUInt16LE(at + 32);
  }
  return dated;
}
