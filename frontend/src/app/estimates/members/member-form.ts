import { DestroyRef, effect, inject, untracked } from '@angular/core';
import { takeUntilDestroyed } from '@angular/core/rxjs-interop';
import { canonicalJson } from '#shared/estimates/canonical-json';
import type { Member, MemberContent } from '#shared/estimates/member';
import { memberContentSchema } from '#shared/estimates/member-schema';
import { type DocumentForm, documentForm } from '../../core/forms/document-form';
import { UnfinishedEntries } from '../draft/unfinished-entries';
import { EstimateStore } from '../estimate-store';
import { followingRun } from './following-run';
import { MemberSelection } from './member-selection';

export type MemberForm = DocumentForm<typeof memberContentSchema>;

const contentOf = ({ id: _id, ...content }: Member): MemberContent => content;

/**
 * The form of the selected member, in step with the draft: what can be kept goes there at once, what cannot waits here; what comes from
 * elsewhere (undo, somebody else) is shown. An ornament that fills the run of its member follows it. Call it in a field of a component.
 */
export function memberForm(): MemberForm {
  const [store, selection, unfinished] = [inject(EstimateStore), inject(MemberSelection), inject(UnfinishedEntries)];
  const form = documentForm(memberContentSchema);
  let shown: string | undefined;
  let begun: MemberContent | undefined;

  function show(member: Member): void {
    const [content, isAnother] = [contentOf(member), member.id !== shown];
    const isChanged = () => !unfinished.ids().has(member.id) && canonicalJson(form.parsed()) !== canonicalJson(content);
    if (!isAnother && !isChanged()) return;
    [shown, begun] = [member.id, content];
    form.reset((isAnother ? unfinished.of<MemberContent>(member.id) : undefined) ?? content, !store.mayEdit());
  }

  function take(): void {
    const [content, id] = [form.parsed(), shown];
    if (id === undefined) return;
    if (!content) return unfinished.put(id, form.entered());
    // From what the form began with, since a length that is typed passes through many on its way. Putting it comes here again.
    const following = begun && followingRun(begun, content);
    if (following) return form.put(following.path, following.run_mm);
    unfinished.forget(id);
    store.changeMember(id, content);
  }

  effect(() => {
    const member = selection.member();
    unfinished.ids();
    if (member) untracked(() => show(member));
  });
  effect(() => {
    const refused = store.refusals().filter(({ id }) => id === selection.member()?.id);
    if (refused.length > 0) untracked(() => form.complain(refused));
  });
  form.edited.pipe(takeUntilDestroyed(inject(DestroyRef))).subscribe(take);
  return form;
}
