/** A file as the answer: its name is sent safely encoded, and a browser may not run it. */
export class FileAnswer {
  constructor(
    readonly bytes: Buffer,
    readonly file: { readonly name: string; readonly media: string; readonly shownInPage?: boolean },
  ) {}
}

/** JSON made, checked and gzipped when it was saved, sent as it lies. */
export class PreparedAnswer {
  constructor(
    readonly gzip: Buffer,
    readonly version: number,
  ) {}
}
