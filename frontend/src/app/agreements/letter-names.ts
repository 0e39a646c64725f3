import type { LetterKind } from '#shared/agreements/letter-kinds';

/** What each kind of letter is called, and when it leaves. */
export const letterNames: Readonly<Record<LetterKind, { readonly name: string; readonly when: string }>> = {
  estimate: { name: $localize`An estimate`, when: $localize`Goes out when an issue is sent to its client.` },
  variation: { name: $localize`A variation`, when: $localize`Goes out when a variation is sent to the client.` },
  answer: { name: $localize`An answer`, when: $localize`Goes out when a question of the client is answered.` },
  accepted: { name: $localize`Accepted`, when: $localize`Goes to both sides with the paper that was accepted.` },
  'sign-in': {
    name: $localize`A way in`,
    when: $localize`Goes out when a client asks for a link to all of their papers.`,
  },
  invoice: { name: $localize`An invoice`, when: $localize`Goes out with an invoice.` },
  'credit-note': { name: $localize`A credit note`, when: $localize`Goes out with a credit note.` },
  receipt: { name: $localize`A receipt`, when: $localize`Goes out when a payment was received.` },
  reminder: { name: $localize`A reminder`, when: $localize`Goes out when an overdue invoice is reminded of.` },
  statement: { name: $localize`A statement`, when: $localize`Goes out with a statement of account.` },
};
