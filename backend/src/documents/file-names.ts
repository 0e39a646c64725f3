/** A name a file can bear on any machine and in any header: letters, digits, hyphens and full stops only. */
export function fileName(parts: readonly string[], ending: string): string {
  const plain = parts
    .map((part) =>
      part
        .normalize('NFKD')
        .replace(/\p{M}/gu, '')
        .replace(/[^A-Za-z0-9.]+/g, '-')
        .replace(/^[-.]+|[-.]+$/g, ''),
    )
    .filter((part) => part !== '');
  return `${plain.join('-').slice(0, 100)}.${ending}`;
}
