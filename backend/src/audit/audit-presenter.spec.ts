import type { AuditRow } from './audit-model';
import { presentAuditEntry, presentAuditLine } from './audit-presenter';

const row = (subjectKind: string, before: object | null, after: object | null): AuditRow => ({
  workshopId: 'w',
  id: 'a',
  at: new Date('2026-03-02T10:00:00.000Z'),
  accountId: 'p',
  name: 'Orla',
  subjectKind,
  subjectId: 's',
  jobId: 'j',
  code: 'history-member-changed',
  values: { name: 'Frieze' },
  before,
  after,
});
const changed = { path: ['count'], what: 'changed', before: 2, after: 5 };

test.each(['member', 'piece', 'job', 'client'])('everybody who reads the history sees what changed of a %s', (kind) => {
  const line = presentAuditLine(row(kind, { count: 2 }, { count: 5 }));
  expect(line.changes).toEqual([changed]);
  expect(Object.keys(line)).not.toContain('before');
});

test.each(['settings', 'rate-card', 'workshop', 'person', 'issue', 'estimate'])(
  'what changed of a %s, which may be money, is for those who see cost',
  (kind) => {
    const margin = row(kind, { profit: { percent: '18' } }, { profit: { percent: '25' } });
    expect(presentAuditLine(margin).changes).toEqual([]);
    expect(presentAuditEntry(margin).changes).toEqual([
      { path: ['profit', 'percent'], what: 'changed', before: '18', after: '25' },
    ]);
  },
);

test('a long comparison is cut short', () => {
  const sides = (first: number) => ({ sides_mm: Array.from({ length: 90 }, (_, index) => first + index) });
  expect(presentAuditLine(row('member', sides(0), sides(100))).changes).toHaveLength(40);
});

test('what was made or removed has no fields that changed', () => {
  expect(presentAuditLine(row('member', null, { count: 5 })).changes).toEqual([]);
});
