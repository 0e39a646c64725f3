import { migration } from '../src/platform/database/migration';

/** The history says why something was written off: what was entered before is told there too, from the write-off itself. */
export const writtenOffBecause = migration('0052-written-off-because', [
  `UPDATE audit JOIN write_offs ON write_offs.workshop_id = audit.workshop_id AND write_offs.invoice_id = audit.subject_id
      AND write_offs.amount_minor = JSON_VALUE(audit.\`values\`, '$.amount_minor') AND ABS(TIMESTAMPDIFF(SECOND, write_offs.at, audit.at)) <= 60
    SET audit.\`values\` = JSON_SET(audit.\`values\`, '$.reason', write_offs.reason)
    WHERE audit.code = 'history-written-off' AND JSON_VALUE(audit.\`values\`, '$.reason') IS NULL`,
  `UPDATE audit SET \`values\` = JSON_SET(\`values\`, '$.reason', '–')
    WHERE code = 'history-written-off' AND JSON_VALUE(\`values\`, '$.reason') IS NULL`,
]);
