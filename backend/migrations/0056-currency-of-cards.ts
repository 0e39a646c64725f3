import { migration } from '../src/platform/database/migration';

/** A rate card says in which currency its prices are meant: those there are, in the one their workshop has today. */
export const currencyOfCards = migration('0056-currency-of-cards', [
  `UPDATE rate_cards JOIN workshops ON workshops.id = rate_cards.workshop_id
    SET rate_cards.content = JSON_SET(rate_cards.content, '$.money.currency', workshops.currency)
    WHERE (rate_cards.in_force_from IS NULL OR rate_cards.based_on_id IS NOT NULL)
      AND NOT JSON_EXISTS(rate_cards.content, '$.money.currency')`,
]);
