import * as z from 'zod';
import type { Endpoint } from '#shared/actor/endpoint';

/** What each of the templates below would come to if anything worked it out; too long to stand in a secret or a hash by chance. */
export const workedOut = '9953054';
const templates = '{{998*9973}}${998*9973}<%= 998*9973 %>#{998*9973}';

/** Ways text has become script, markup, style, address or template elsewhere (OWASP on cross-site scripting and injection). */
export const hostileTexts: readonly string[] = [
  '<script>alert(1)</script>',
  '<img src=x onerror=alert(1)>',
  '"><svg onload=alert(1)>',
  `' onmouseover='alert(1)' x='`,
  templates,
  'javascript:alert(1)//',
  '</textarea><script>alert(1)</script>',
  '<iframe srcdoc="<script>alert(1)</script>">',
  `{{constructor.constructor('alert(1)')()}}`,
  '<a href="javascript:alert(1)">x</a>',
  `<style>@import'//evil.test/x'</style>`,
  '&lt;script&gt;alert(1)&lt;/script&gt;',
  '{count, plural, other {<b>#</b>}}',
  '<math><mtext></table><img src=x onerror=alert(1)>',
];
/** For entries of twenty characters. */
const shortText = '<b>{{998*9973}}';

/** What nobody may read anywhere. */
const secret = /^(password|token|current)$/;

type Path = readonly (string | number)[];
type Node = Record<string | number, unknown>;

/** The paths of all texts in a body. */
function textsIn(value: unknown, path: Path = []): Path[] {
  if (typeof value === 'string') return [path];
  if (value === null || typeof value !== 'object') return [];
  const entries = Array.isArray(value) ? [...value.entries()] : Object.entries(value);
  return entries.flatMap(([name, inner]) => textsIn(inner, [...path, name]));
}

const at = (body: unknown, path: Path): unknown =>
  path.reduce<unknown>((inner, name) => (inner as Node | undefined)?.[name], body);

function withText(body: unknown, paths: readonly Path[], text: string): unknown {
  const copy = structuredClone(body);
  for (const path of paths) (at(copy, path.slice(0, -1)) as Node)[path.at(-1) ?? ''] = text;
  return copy;
}

interface JsonSchema {
  readonly type?: string;
  readonly properties?: Record<string, JsonSchema>;
  readonly additionalProperties?: JsonSchema | boolean;
  readonly items?: JsonSchema;
  readonly anyOf?: readonly JsonSchema[];
  readonly oneOf?: readonly JsonSchema[];
  readonly allOf?: readonly JsonSchema[];
}

function freeTexts(schema: JsonSchema, path: string): string[] {
  const inner = (one: JsonSchema, name: string) => freeTexts(one, path ? `${path}.${name}` : name);
  const isFree = schema.type === 'string' && !/"(enum|const|format|pattern)":/.test(JSON.stringify(schema));
  return [
    ...(isFree ? [path] : []),
    ...[...(schema.anyOf ?? []), ...(schema.oneOf ?? []), ...(schema.allOf ?? [])].flatMap((one) =>
      freeTexts(one, path),
    ),
    ...Object.entries(schema.properties ?? {}).flatMap(([name, one]) => inner(one, name)),
    ...(typeof schema.additionalProperties === 'object' ? inner(schema.additionalProperties, '*') : []),
    ...(schema.items ? inner(schema.items, '*') : []),
  ];
}

/** Every entry of a request's body whose schema asks for text without prescribing its form. */
export function freeTextsOf({ name, body }: Endpoint): string[] {
  if (!body) return [];
  const schema = z.toJSONSchema(body, { io: 'input', unrepresentable: 'any', reused: 'inline' });
  return [...new Set(freeTexts(schema as JsonSchema, name))];
}

/** An entry, where it stands in a body, and which texts another rule lets in. */
interface Sowing {
  readonly field: string;
  readonly paths: readonly Path[];
  readonly fits: (text: string) => boolean;
}

/** Puts hostile texts into bodies, each with a number of its own so that it is known again where it turns up. */
export class Planting {
  /** The text that went into each entry, by request and path. */
  readonly texts = new Map<string, string>();

  /** The body with a hostile text in every entry that takes one and is not refused by another rule (`fits`); what prescribes its form stays as it is. */
  into({ name, body: schema }: Endpoint, body: unknown, fits: (text: string) => boolean = () => true): unknown {
    const fields = new Map<string, Path[]>();
    for (const path of textsIn(body).filter((one) => !secret.test(String(one.at(-1))))) {
      const field = [name, ...path].map((part) => (typeof part === 'number' ? '*' : part)).join('.');
      const known = field.replace(/\.typed\..*$/, '.typed.*');
      fields.set(known, [...(fields.get(known) ?? []), path]);
    }
    return [...fields].reduce((sown, [field, paths]) => this.sow(schema!, sown, { field, paths, fits }), body);
  }

  private sow(schema: z.ZodType, body: unknown, { field, paths, fits }: Sowing): unknown {
    const number = this.texts.size;
    const inTurn = [...hostileTexts, ...hostileTexts].slice(number % hostileTexts.length).filter(fits);
    for (const text of [...inTurn.slice(0, 1), shortText]) {
      const marked = `q${number} ${text}`;
      for (const where of [paths, paths.filter((path) => at(body, path) !== ''), paths.slice(0, 1)]) {
        const sown = withText(body, where, marked);
        if (where.length > 0 && schema.safeParse(sown).success) {
          this.texts.set(field, marked);
          return sown;
        }
      }
    }
    return body;
  }
}
