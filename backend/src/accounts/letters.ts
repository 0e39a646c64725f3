import type { Config } from '../platform/config/config';
import { ownOrigin } from '../platform/config/own-origin';
import { words } from '../platform/http/words';
import type { Letter } from '../platform/mail/mailbox';

/** The pages that mailed links lead to. */
const pages = { reset: '/new-password', invitation: '/join', foundation: '/found' } as const;

type Addressee = Letter['to'];

/** The mails of this feature. */
export class Letters {
  constructor(private readonly config: Config) {}

  reset(to: Addressee, token: string): Letter {
    return {
      to,
      subject: words('mail-reset-subject'),
      text: words('mail-reset-text', { name: to.name, link: this.link('reset', token) }),
    };
  }

  foundation(to: Addressee, details: { token: string; workshop: string; isKnown: boolean }): Letter {
    const { workshop, token, isKnown } = details;
    return {
      to,
      subject: words('mail-foundation-subject', { workshop }),
      text: words(isKnown ? 'mail-foundation-known-text' : 'mail-foundation-text', {
        name: to.name,
        workshop,
        link: this.link('foundation', token),
      }),
    };
  }

  invitation(to: Addressee, details: { token: string; workshop: string; by: string }): Letter {
    const { workshop, token, by } = details;
    return {
      to,
      subject: words('mail-invitation-subject', { workshop }),
      text: words('mail-invitation-text', { name: to.name, workshop, by, link: this.link('invitation', token) }),
    };
  }

  /** The secret stands in the fragment, which no server and no log ever sees. */
  private link(page: keyof typeof pages, token: string): string {
    return `${ownOrigin(this.config)}${pages[page]}#${token}`;
  }
}
