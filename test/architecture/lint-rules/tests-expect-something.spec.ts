import { ruleTester } from './rule-tester';
import { testsExpectSomething } from './tests-expect-something';

const errors = [{ messageId: 'nothing' }];

ruleTester.run('tests-expect-something', testsExpectSomething, {
  valid: [
    { name: 'an expectation', code: "it('adds', () => { expect(add(1, 1)).toBe(2); });" },
    { name: 'an expectation of its own making', code: "test('adds', () => expectSum(add(1, 1), 2));" },
    { name: 'a law', code: "it('grows', () => { fc.assert(fc.property(fc.nat(), grows)); });" },
    { name: 'an answer expected by the caller', code: "it('answers', () => request(app).get('/').expect(200));" },
    { name: 'a table', code: "it.each([[1, 2]])('%d', (a, b) => { expect(next(a)).toBe(b); });" },
    { name: 'a function of another name', code: "describe('adding', () => { add(1, 1); });" },
  ],
  invalid: [
    { name: 'only a call', code: "it('adds', () => { add(1, 1); });", errors },
    { name: 'an empty one', code: "test('adds', async function () {});", errors },
    { name: 'a table that is only walked', code: "it.each([[1, 2]])('%d', (a) => { next(a); });", errors },
  ],
});
