import * as z from 'zod';
import { shareEntry } from '#shared/measure/length-schema';
import { asTyped } from '#shared/problems/entry-schema';

/** What a zone may take of its member: a share in per cent, or parts of the girth by their keys. */
export const zoneTakeSchema = z.discriminatedUnion('way', [
  z.strictObject({ way: z.literal('share'), share_percent: shareEntry }),
  z.strictObject({ way: z.literal('parts'), parts: z.array(asTyped(64).min(1)).max(64) }),
]);
