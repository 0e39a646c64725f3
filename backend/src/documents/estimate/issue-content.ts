import { chosenDraft } from '#shared/estimates/chosen-draft';
import type { Draft } from '#shared/estimates/draft';
import type { Member } from '#shared/estimates/member';
import type { Snapshot } from '#shared/estimates/snapshot';
import { paperWords, type PaperWords } from '../paper-words';

/** An issue ready to be written: its words, and the draft as the choice of alternatives makes it. */
export interface IssueContent {
  readonly snapshot: Snapshot;
  readonly draft: Draft;
  readonly words: PaperWords;
  /** Whether its price has any tax in it, so that a paper may say it is included. */
  readonly taxed: 'yes' | 'no';
}

/** Puts an issue together with the words its papers are written in. */
export const issueContent = (snapshot: Snapshot): IssueContent => ({
  snapshot,
  draft: chosenDraft(snapshot.draft, snapshot.choice),
  words: paperWords(snapshot.workshop),
  taxed: snapshot.figures.price.taxes.some(({ tax_minor }) => tax_minor !== 0) ? 'yes' : 'no',
});

/** A member by its id, of the base or of any alternative. */
export const memberOf = ({ snapshot }: IssueContent, id: string | null): Member | undefined =>
  snapshot.draft.members.find((member) => member.id === id);
