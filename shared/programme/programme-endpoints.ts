import * as z from 'zod';
import { endpoint, sameForPriced } from '#shared/actor/endpoint';
import { identifier } from '#shared/problems/entry-schema';
import { programmeInputsSchema, programmePlanSchema, programmeSchema } from '#shared/programme/programme-schema';
import { shopContentSchema, shopSchema } from '#shared/programme/shop-schema';
import { solutionRequestSchema, solutionSchema } from '#shared/programme/solution-schema';
import { whatIfAnswerSchema, whatIfSchema } from '#shared/programme/what-if-schema';

const oneEstimate = z.strictObject({ estimateId: identifier });
const oneSolution = z.strictObject({ solutionId: identifier });

export const readShop = endpoint({
  name: 'readShop',
  summary: 'What the workshop has to work with: hours, closed days, air, places and people',
  method: 'get',
  path: '/api/programme/shop',
  callers: ['owner', 'estimator', 'office'],
  answers: sameForPriced(shopSchema),
});

export const keepShop = endpoint({
  name: 'keepShop',
  summary: 'Keep what the workshop has to work with; a first entry carries version 0',
  method: 'put',
  path: '/api/programme/shop',
  callers: ['owner', 'estimator'],
  body: shopContentSchema,
  versioned: true,
  answers: { cost: shopSchema },
});

export const readProgramme = endpoint({
  name: 'readProgramme',
  summary:
    'The programme of an estimate: inputs, what the solver is given around the work promised elsewhere, the plan kept, its dates',
  method: 'get',
  path: '/api/estimates/:estimateId/programme',
  callers: ['owner', 'estimator', 'office'],
  params: oneEstimate,
  answers: sameForPriced(programmeSchema),
});

export const keepProgramme = endpoint({
  name: 'keepProgramme',
  summary:
    'Keep what was entered of a programme: start or wanted day, air, lots, pins, approvals; a first entry carries version 0',
  method: 'put',
  path: '/api/estimates/:estimateId/programme',
  callers: ['owner', 'estimator'],
  params: oneEstimate,
  body: programmeInputsSchema,
  versioned: true,
  answers: { cost: programmeSchema },
});

export const keepPlan = endpoint({
  name: 'keepPlan',
  summary:
    'Keep a plan that was worked out in the browser; refused in words where it breaks a rule of the programme as it stands',
  method: 'put',
  path: '/api/estimates/:estimateId/programme/plan',
  callers: ['owner', 'estimator'],
  params: oneEstimate,
  body: programmePlanSchema,
  versioned: true,
  answers: { cost: programmeSchema },
});

export const solveProgramme = endpoint({
  name: 'solveProgramme',
  summary: 'Plan the programme on the server; whoever asks again while that goes on is told of the same solution',
  method: 'post',
  path: '/api/estimates/:estimateId/programme/solutions',
  callers: ['owner', 'estimator'],
  params: oneEstimate,
  body: solutionRequestSchema,
  atOnce: 1,
  answers: { cost: solutionSchema },
});

export const readSolution = endpoint({
  name: 'readSolution',
  summary: 'How far the planning has come, with the best plan so far',
  method: 'get',
  path: '/api/programme-solutions/:solutionId',
  callers: ['owner', 'estimator'],
  params: oneSolution,
  answers: { cost: solutionSchema },
});

export const stopSolution = endpoint({
  name: 'stopSolution',
  summary: 'Stop planning and keep the best plan so far',
  method: 'post',
  path: '/api/programme-solutions/:solutionId/stop',
  callers: ['owner', 'estimator'],
  params: oneSolution,
  answers: { cost: solutionSchema },
});

export const readWhatIf = endpoint({
  name: 'readWhatIf',
  summary:
    'What the solver is given if the start, the people, a size or the air were another, and what that does to cost and price; nothing is kept',
  method: 'post',
  path: '/api/estimates/:estimateId/programme/what-if',
  callers: ['owner', 'estimator'],
  params: oneEstimate,
  body: whatIfSchema,
  answers: { cost: whatIfAnswerSchema },
});

export const holdSlot = endpoint({
  name: 'holdSlot',
  summary: 'Hold the planned slot for the issue that was sent, until its validity ends',
  method: 'put',
  path: '/api/estimates/:estimateId/programme/hold',
  callers: ['owner', 'estimator', 'office'],
  params: oneEstimate,
  answers: sameForPriced(programmeSchema),
});

export const releaseSlot = endpoint({
  name: 'releaseSlot',
  summary: 'Give a held slot up',
  method: 'delete',
  path: '/api/estimates/:estimateId/programme/hold',
  callers: ['owner', 'estimator', 'office'],
  params: oneEstimate,
  answers: sameForPriced(programmeSchema),
});
