import { noEndlessSubscription } from './no-endless-subscription';
import { ruleTester } from './rule-tester';

const errors = [{ messageId: 'endless' }];

ruleTester.run('no-endless-subscription', noEndlessSubscription, {
  valid: [
    { name: 'until the page goes', code: 'changes.pipe(debounceTime(600), takeUntilDestroyed()).subscribe(save);' },
    {
      name: 'until a given owner goes',
      code: 'this.changes.pipe(takeUntilDestroyed(this.destroyRef)).subscribe(save);',
    },
    { name: 'once', code: 'answer.pipe(take(1)).subscribe(show);' },
    { name: 'the first that fits', code: 'answers.pipe(first(isWhole)).subscribe(show);' },
    {
      name: 'an end in the stream it is made from',
      code: 'const events = form.events.pipe(takeUntilDestroyed(owner)); events.pipe(filter(isVisit)).subscribe(show);',
    },
    { name: 'a value awaited', code: 'const answer = await firstValueFrom(answers);' },
  ],
  invalid: [
    { name: 'no pipe at all', code: 'changes.subscribe(save);', errors },
    { name: 'a pipe without an end', code: 'changes.pipe(debounceTime(600)).subscribe(save);', errors },
    {
      name: 'an end inside an inner stream',
      code: 'changes.pipe(switchMap(() => answer.pipe(take(1)))).subscribe(save);',
      errors,
    },
    { name: 'an end in an earlier step', code: 'watch(changes.pipe(take(1))).subscribe(save);', errors },
  ],
});
