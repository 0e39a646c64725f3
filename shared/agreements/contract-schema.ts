import * as z from 'zod';
import type { Contract, ContractPart } from '#shared/agreements/contract';
import { taxCodes } from '#shared/money/tax-codes';

const minor = z.int();
const share = z.union([z.string(), z.number()]);

const contractPartSchema = z.strictObject({
  issueId: z.uuid(),
  estimateId: z.uuid(),
  kind: z.enum(['estimate', 'variation']),
  number: z.string(),
  title: z.string(),
  acceptedOn: z.string(),
  choice: z.array(z.uuid()),
  taxes: z.array(
    z.strictObject({
      tax: z.strictObject({ code: z.enum(taxCodes), percent: z.string() }),
      net_minor: minor,
      tax_minor: minor,
    }),
  ),
  exemptions: z.array(z.strictObject({ code: z.enum(taxCodes), reason: z.string() })),
  net_minor: minor,
  tax_minor: minor,
  gross_minor: minor,
  plan: z.strictObject({ deposit_percent: share, stages_percent: z.array(share), retention_percent: share }),
  stageNames: z.array(z.string()),
}) satisfies z.ZodType<ContractPart>;

/** A contract as those who see prices read it. */
export const contractSchema = z.strictObject({
  jobId: z.uuid(),
  clientId: z.uuid(),
  currency: z.string(),
  parts: z.array(contractPartSchema),
  net_minor: minor,
  tax_minor: minor,
  gross_minor: minor,
}) satisfies z.ZodType<Contract>;
