import { v7 as newId } from 'uuid';
import { beginVariation } from '#shared/agreements/agreement-endpoints';
import { acceptIssue } from '#shared/client-page/client-issues-endpoints';
import { changeEstimate } from '#shared/estimates/estimates-endpoints';
import { acceptanceOf, issueOf } from './sample-client-visit';
import type { Api, TestWorkshop } from './start-api';
import type { Visitor } from './visitor';

async function done(call: PromiseLike<{ status: number; text: string }>): Promise<void> {
  const response = await call;
  if (response.status >= 300) throw new Error(`the sample could not be made: ${response.status} ${response.text}`);
}

/** A variation of what was agreed on a job, of one line at a price, which may be below nothing; answers its estimate. */
export async function variationDraft(
  workshop: TestWorkshop,
  api: Api,
  of: { jobId: string; price: string; title?: string; taxCategoryId?: string },
): Promise<string> {
  const { visitor } = workshop.people.owner;
  const [id, title] = [newId(), of.title ?? 'The frieze stays plain'];
  await done(visitor.call(beginVariation, { params: { jobId: of.jobId }, body: { id, title } }));
  const { settings } = (await api.app.estimates.drafts.whole(workshop.id, id)).estimate;
  const taxCategoryId = of.taxCategoryId ?? settings.taxCategoryId;
  const extra = {
    ...{ id: newId(), name: title, taxCategoryId, memberId: null, alternativeId: null },
    ...{ kind: 'price', price: of.price },
  };
  const changes = [{ kind: 'settings', id, version: 1, content: { ...settings, extras: [extra] } }];
  await done(visitor.call(changeEstimate, { params: { estimateId: id }, body: { changes } }));
  return id;
}

/** A variation its client has accepted on the page; answers its issue. */
export async function acceptedVariation(
  workshop: TestWorkshop,
  api: Api,
  of: { jobId: string; price: string; visitor: Visitor },
): Promise<string> {
  const issueId = await issueOf(workshop, api, await variationDraft(workshop, api, of));
  await done(of.visitor.call(acceptIssue, await acceptanceOf(of.visitor, issueId)));
  return issueId;
}
