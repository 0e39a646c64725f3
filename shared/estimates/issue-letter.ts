/** The letter of the n-th issue of an estimate, from 1: A … Z, AA, AB …; RangeError for anything but a whole number above 0. */
export function issueLetter(sequence: number): string {
  if (!Number.isInteger(sequence) || sequence < 1) throw new RangeError('issues are counted from 1');
  const rest = Math.floor((sequence - 1) / 26);
  return (rest > 0 ? issueLetter(rest) : '') + String.fromCharCode(65 + ((sequence - 1) % 26));
}
