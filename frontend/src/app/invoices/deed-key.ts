import { newId } from '../core/new-id';

/**
 * The key of a deed done once. It stays while the same thing is asked again (a second press, an answer that was lost), and is another
 * one as soon as something else is asked.
 */
export class DeedKey {
  private asked = '';
  private key = newId();

  of(deed: unknown): string {
    const written = JSON.stringify(deed);
    if (written !== this.asked) this.key = newId();
    this.asked = written;
    return this.key;
  }

  /** What comes next is another deed, even if it reads the same. */
  renew(): void {
    this.asked = '';
  }
}
