import * as z from 'zod';
import { endpoint } from '#shared/actor/endpoint';
import { clientIssueSchema } from '#shared/client-page/client-issue-schema';
import { clientOverviewSchema } from '#shared/client-page/client-overview-schema';
import { firstCalls } from '#shared/client-page/first-calls';
import { emailAddress } from '#shared/problems/entry-schema';

export const beginClientVisit = endpoint({
  ...firstCalls.beginClientVisit,
  body: z.strictObject({ token: z.string().min(1).max(200) }),
  answers: {
    public: z.strictObject({
      token: z.string(),
      papers: clientOverviewSchema,
      /** Null where the list comes first. */
      issue: clientIssueSchema.nullable(),
    }),
  },
});

export const askForClientSignIn = endpoint({
  name: 'askForClientSignIn',
  summary: 'Ask for a link to all of one’s papers by mail; the answer is the same whether the address is known or not',
  method: 'post',
  path: '/api/client/sign-in-letters',
  callers: 'anyone',
  body: z.strictObject({ email: emailAddress }),
  answers: {},
});
