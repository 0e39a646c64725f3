/** Every text of the other workshop carries this word: it must never appear in an answer to ours. */
export const canary = 'Kanarienvogel';
