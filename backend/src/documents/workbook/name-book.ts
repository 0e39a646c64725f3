/** The names of a workbook, each for one cell; made from ids, so that no text somebody typed is part of a formula. */
export class NameBook {
  private readonly cells = new Map<string, string>();

  /** Gives a cell a name of letters, digits and underscores, told apart from every other, and says which. */
  add(parts: readonly string[], address: string): string {
    const plain = parts
      .join('_')
      .toLowerCase()
      .replace(/[^a-z0-9_]+/g, '_');
    let name = plain;
    for (let more = 2; this.cells.has(name); more += 1) name = `${plain}_${more}`;
    this.cells.set(name, address);
    return name;
  }

  get all(): readonly { readonly name: string; readonly address: string }[] {
    return [...this.cells].map(([name, address]) => ({ name, address }));
  }
}
