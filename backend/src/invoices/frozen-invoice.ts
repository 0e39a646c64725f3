import { createHash } from 'node:crypto';
import { gunzipSync, gzipSync } from 'node:zlib';
import { canonicalJson } from '#shared/estimates/canonical-json';
import type { FrozenInvoice } from '#shared/invoices/invoice';
import type { InvoiceRow } from './invoice-model';

/** An invoice as it is kept: gzipped canonical JSON and the SHA-256 of that JSON. */
export function frozenInvoice(invoice: FrozenInvoice): { snapshot: Buffer; sha256: string } {
  const json = canonicalJson(invoice);
  return { snapshot: gzipSync(json), sha256: createHash('sha256').update(json).digest('hex') };
}

/** Reads an issued invoice; throws when the bytes are not those that were frozen. */
export function thawedInvoice({ snapshot, sha256, id }: Pick<InvoiceRow, 'snapshot' | 'sha256' | 'id'>): FrozenInvoice {
  if (!snapshot) throw new Error(`invoice ${id} has not been issued`);
  const json = gunzipSync(snapshot);
  if (createHash('sha256').update(json).digest('hex') !== sha256)
    throw new Error(`invoice ${id} is not what was frozen`);
  return JSON.parse(json.toString('utf8')) as FrozenInvoice;
}
