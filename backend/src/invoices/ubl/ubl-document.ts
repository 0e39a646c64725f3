import { create } from 'xmlbuilder2';
import type { XMLBuilder } from 'xmlbuilder2/lib/interfaces';

/** A value of an element, with the attributes it carries. */
export interface UblValue {
  readonly text: string;
  readonly attributes?: Readonly<Record<string, string>>;
}

/**
 * What stands in an element, in the order of the published schema: basic parts (`cbc:`) are texts, aggregates (`cac:`) are lists of
 * parts. Null and empty texts are left out, and so is an aggregate in which nothing is left.
 */
export type UblPart = readonly [name: string, content: string | null | UblValue | readonly (UblPart | null)[]];

const isAggregate = (content: UblPart[1]): content is readonly (UblPart | null)[] => Array.isArray(content);

function isEmpty(content: UblPart[1]): boolean {
  if (content === null) return true;
  if (typeof content === 'string') return content.trim() === '';
  if (isAggregate(content)) return content.every((part) => part === null || isEmpty(part[1]));
  return content.text.trim() === '';
}

// XML 1.0 knows none of these, and no reader forgives them.
const unwritable = /[\u0000-\u0008\u000b\u000c\u000e-\u001f\ufffe\uffff]/g;
const written = (text: string): string => text.replace(unwritable, '').trim();

function write(parent: XMLBuilder, [name, content]: UblPart): void {
  if (isEmpty(content) || content === null) return;
  if (typeof content === 'string') return void parent.ele(`cbc:${name}`).txt(written(content));
  if (!isAggregate(content)) {
    return void parent.ele(`cbc:${name}`, { ...content.attributes }).txt(written(content.text));
  }
  const element = parent.ele(`cac:${name}`);
  for (const part of content) if (part) write(element, part);
}

const spaces = {
  cac: 'urn:oasis:names:specification:ubl:schema:xsd:CommonAggregateComponents-2',
  cbc: 'urn:oasis:names:specification:ubl:schema:xsd:CommonBasicComponents-2',
} as const;

/** A whole document of UBL 2.1 with its root, as UTF-8 text. */
export function ublDocument(root: 'Invoice' | 'CreditNote', parts: readonly (UblPart | null)[]): string {
  const document = create({ version: '1.0', encoding: 'UTF-8' });
  const element = document.ele(`urn:oasis:names:specification:ubl:schema:xsd:${root}-2`, root);
  for (const [prefix, space] of Object.entries(spaces))
    element.att('http://www.w3.org/2000/xmlns/', `xmlns:${prefix}`, space);
  for (const part of parts) if (part) write(element, part);
  return document.end({ prettyPrint: true });
}
