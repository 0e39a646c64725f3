import type { Rule } from 'eslint';

/** What the template parser gives for `name="value"`; `i18n` is there when the element carries `i18n-name`. */
interface TextAttribute {
  readonly name: string;
  readonly value: string;
  readonly i18n?: unknown;
}

const spoken = new Set(
  'alt aria-description aria-label aria-placeholder aria-roledescription aria-valuetext caption heading hint label matTooltip placeholder summary title'.split(
    ' ',
  ),
);

/** An attribute that somebody reads or hears is marked for translation like any other text. */
export const spokenAttributesAreMarked: Rule.RuleModule = {
  meta: {
    type: 'problem',
    schema: [],
    messages: { unmarked: 'This is read or heard by people: mark it with i18n-{{ name }}.' },
  },
  create(context) {
    return {
      TextAttribute(node: Rule.Node) {
        const { name, value, i18n } = node as unknown as TextAttribute;
        if (!spoken.has(name) || i18n !== undefined || !/\p{Letter}/u.test(value)) return;
        context.report({ node, messageId: 'unmarked', data: { name } });
      },
    };
  },
};
