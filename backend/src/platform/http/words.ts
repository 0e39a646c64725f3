import { en } from '#shared/words/en';
import { say, type ValueFormats } from '#shared/words/say';

/** Before anybody's workshop is known, figures are written plainly, with the unit's name. */
const plainFormats: ValueFormats = { locale: 'en-GB', write: (unit, figure) => `${figure} ${unit}` };

/** Words a code in the language of the server. */
export const words = say(en, plainFormats);
