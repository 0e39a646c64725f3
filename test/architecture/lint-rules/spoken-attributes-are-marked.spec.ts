import { templateParser } from 'angular-eslint';
import { RuleTester } from 'eslint';
import { spokenAttributesAreMarked } from './spoken-attributes-are-marked';

const errors = [{ messageId: 'unmarked' }];
const tester = new RuleTester({ languageOptions: { parser: templateParser } });

tester.run('spoken-attributes-are-marked', spokenAttributesAreMarked, {
  valid: [
    { name: 'a marked name', code: '<nav i18n-aria-label aria-label="Places of the job"></nav>' },
    { name: 'a bound name', code: '<nav [attr.aria-label]="name()"></nav>' },
    { name: 'an empty alternative', code: '<img alt="" src="mark.svg" />' },
    { name: 'a figure', code: '<input placeholder="0" />' },
    { name: 'what nobody reads', code: '<a routerLink="/jobs" class="plain"></a>' },
  ],
  invalid: [
    { name: 'an unmarked name', code: '<nav aria-label="Places of the job"></nav>', errors },
    { name: 'the input of a widget', code: '<app-field label="Width" />', errors },
    { name: 'inside a branch', code: '@if (open()) { <img alt="The member" src="member.svg" /> }', errors },
    { name: 'on a template of its own', code: '<ng-template><button title="Close"></button></ng-template>', errors },
  ],
});
