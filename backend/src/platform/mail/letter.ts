/** A file that goes with a letter: named by its row, read when the letter leaves. */
export interface Enclosure {
  readonly fileId: string;
}

/** A mail to one person: as plain text, and as HTML where there is some. */
export interface Letter {
  readonly to: { readonly name: string; readonly email: string };
  readonly subject: string;
  readonly text: string;
  readonly html?: string;
  /** In whose name it goes out; the address is the server's own. */
  readonly from?: string;
  readonly replyTo?: string;
  readonly enclosures?: readonly Enclosure[];
}
