import { migration } from '../src/platform/database/migration';

/** Programmes say how many hands a kind of work takes, workshops what overtime costs more: until now none was entered, and it was half as much again. */
export const handsAndOvertime = migration('0055-hands-and-overtime', [
  `UPDATE programmes SET inputs = JSON_INSERT(inputs, '$.hands', JSON_ARRAY())`,
  `UPDATE shops SET content = JSON_INSERT(content, '$.overtime_percent', 50)`,
]);
