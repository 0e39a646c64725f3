import { TestBed } from '@angular/core/testing';
import * as z from 'zod';
import { problemSchema } from '#shared/problems/problem-schema';
import { words } from '../../../test/sign-in';
import { ProblemError } from '../problems/problem-error';
import { RowForm } from './row-form';

const content = z.strictObject({ title: z.string().min(1), note: z.string() });
const row = content.extend({ id: z.string(), version: z.int() });
type Row = z.infer<typeof row>;

const begin = { title: '', note: '' };
const kept: Row = { id: 'kept', version: 3, title: 'Stand', note: 'lime' };
const stale = (current: unknown) =>
  new ProblemError(
    problemSchema.parse({
      type: 'x',
      title: 'Somebody else was faster.',
      status: 412,
      instance: '',
      errors: [],
      current,
    }),
  );

describe('A form over a row', () => {
  let form: RowForm<typeof content, Row>;
  beforeEach(() => {
    TestBed.configureTestingModule({ providers: [words] });
    form = TestBed.runInInjectionContext(() => new RowForm(content, { row, begin, newId: 'new' }));
  });

  const enter = (title: string) => form.form.group.patchValue({ title });
  const sent: unknown[] = [];
  beforeEach(() => sent.splice(0));
  const keep = (answer: Row | Error) => (seen: object, entered: object) => {
    sent.push([seen, entered]);
    return answer instanceof Error ? Promise.reject(answer) : Promise.resolve(answer);
  };

  it('enters a new row under one id, in version 0, however often it is sent', async () => {
    enter('Stand');
    await form.send(keep(stale(undefined)));
    await form.send(keep(kept));
    const once = [
      { id: 'new', version: 0 },
      { title: 'Stand', note: '' },
    ];
    expect(sent).toEqual([once, once]);
  });

  it('changes a row on the version it shows', async () => {
    form.show(kept);
    enter('Console');
    expect(await form.send(keep({ ...kept, version: 4 }))).toEqual({ ...kept, version: 4 });
    expect(sent).toEqual([
      [
        { id: 'kept', version: 3 },
        { title: 'Console', note: 'lime' },
      ],
    ]);
  });

  it('shows what somebody else kept meanwhile, and keeps what was entered', async () => {
    form.show(kept);
    enter('Console');
    await form.send(keep(stale({ ...kept, version: 5, note: 'oak' })));
    expect([form.meanwhile()?.note, form.form.group.value.title]).toEqual(['oak', 'Console']);
  });

  it('keeps one’s own over theirs on their version', async () => {
    form.show(kept);
    enter('Console');
    await form.send(keep(stale({ ...kept, version: 5, note: 'oak' })));
    await form.sendOver(keep({ ...kept, version: 6 }));
    expect(sent[1]).toEqual([
      { id: 'kept', version: 5 },
      { title: 'Console', note: 'lime' },
    ]);
    expect(form.meanwhile()).toBeUndefined();
  });

  it('sends nothing while something is wrong', async () => {
    form.show(kept);
    enter('');
    expect(await form.send(keep(kept))).toBeUndefined();
    expect(sent).toEqual([]);
  });
});
