import { noEndlessSubscription } from './no-endless-subscription';
import { noStringBuiltSql } from './no-string-built-sql';
import { spokenAttributesAreMarked } from './spoken-attributes-are-marked';
import { testsExpectSomething } from './tests-expect-something';
import { wholeMinorUnits } from './whole-minor-units';

/** The lint rules of this project, by the name they are switched on with. */
export const localRules = {
  'no-endless-subscription': noEndlessSubscription,
  'no-string-built-sql': noStringBuiltSql,
  'spoken-attributes-are-marked': spokenAttributesAreMarked,
  'tests-expect-something': testsExpectSomething,
  'whole-minor-units': wholeMinorUnits,
};
