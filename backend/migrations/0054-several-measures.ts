import { migration } from '../src/platform/database/migration';

/** A line paid by a measuring rule is reckoned from several measures summed, with what was typed beside them; a single one becomes the first. */
export const severalMeasures = migration('0054-several-measures', [
  `UPDATE estimates SET settings = JSON_SET(settings, '$.extras', (
    SELECT JSON_ARRAYAGG(
      IF(JSON_EXISTS(line, '$.measured.rule') AND NOT JSON_EXISTS(line, '$.measured.measures'),
        JSON_SET(line, '$.measured', JSON_OBJECT(
          'rule', JSON_EXTRACT(line, '$.measured.rule'),
          'measures', JSON_ARRAY(JSON_OBJECT(
            'count', 1,
            'length_mm', JSON_EXTRACT(line, '$.measured.length.mm'),
            'girth_mm', JSON_EXTRACT(line, '$.measured.girth.mm'),
            'area_mm2', JSON_EXTRACT(line, '$.measured.area.mm2'),
            'sides', JSON_EXTRACT(line, '$.measured.sides'),
            'worth', JSON_EXTRACT(line, '$.measured.worth'))),
          'typed', JSON_MERGE_PATCH('{}', JSON_OBJECT(
            'measures.0.length_mm', JSON_EXTRACT(line, '$.measured.length.text'),
            'measures.0.girth_mm', JSON_EXTRACT(line, '$.measured.girth.text'),
            'measures.0.area_mm2', JSON_EXTRACT(line, '$.measured.area.text'))))),
        JSON_EXTRACT(line, '$')) ORDER BY place)
    FROM JSON_TABLE(settings, '$.extras[*]' COLUMNS (place FOR ORDINALITY, line JSON PATH '$')) AS kept))
  WHERE JSON_EXISTS(settings, '$.extras[*].measured.rule')`,
]);
