import { noStringBuiltSql } from './no-string-built-sql';
import { ruleTester } from './rule-tester';

const errors = [{ messageId: 'built' }];

ruleTester.run('no-string-built-sql', noStringBuiltSql, {
  valid: [
    {
      name: 'a statement written whole',
      code: "database.query('SELECT id FROM jobs WHERE workshop_id = :workshopId', { replacements });",
    },
    { name: 'a template without parts', code: 'database.query(`SELECT id FROM jobs`);' },
    {
      name: 'parts written in the same file',
      code: "const columns = 'id, name'; database.query(`SELECT ${columns} FROM jobs`);",
    },
    {
      name: 'parts written in an imported file',
      code: "import { id, types } from './types-of-columns'; database.query(`CREATE TABLE jobs (id ${id}, day ${types.day})`);",
    },
    { name: 'one of two written orders', code: "database.query(descending ? 'SELECT 1' : 'SELECT 2');" },
    { name: 'a written text over two lines', code: "database.query('SELECT id ' + 'FROM jobs');" },
    { name: 'a statement handed on', code: 'const run = (sql: string) => database.query(sql);' },
    { name: 'a query that is no SQL', code: "request(app).get('/api/jobs').query({ after: cursor });" },
    { name: 'an English sentence', code: 'const label = `Update ${name}`;' },
    { name: 'SQL asked of something else', code: 'cache.read(`jobs:${id}`);' },
  ],
  invalid: [
    {
      name: 'a value pasted into a template',
      code: 'database.query(`SELECT id FROM jobs WHERE name = "${name}"`);',
      errors,
    },
    { name: 'a value pasted by plus', code: "database.query('SELECT id FROM jobs WHERE name = ' + name);", errors },
    { name: 'a table name from the run', code: 'database.query(`ANALYZE TABLE ${table}`);', errors },
    {
      name: 'a text built before',
      code: 'const sql = `DELETE FROM jobs WHERE id = ${id}`; database.query(sql);',
      errors,
    },
    {
      name: 'a text built before, without a verb in front',
      code: 'const sql = `${verb} FROM jobs`; database.query(sql);',
      errors,
    },
    {
      name: 'the answer of an imported function',
      code: "import { condition } from './condition'; database.query(`SELECT id FROM jobs WHERE ${condition(name)}`);",
      errors,
    },
    {
      name: 'a property of an imported table chosen by the run',
      code: "import { columns } from './columns'; database.query(`SELECT ${columns[key]} FROM jobs`);",
      errors,
    },
    { name: 'pieces joined', code: "database.query(['SELECT id FROM jobs', condition].join(' '));", errors },
    { name: 'a piece put in later', code: "database.query('SELECT id FROM :table'.replace(':table', table));", errors },
    { name: 'the options form', code: 'connection.query({ sql: `SELECT ${column} FROM jobs` });', errors },
    { name: 'a literal of Sequelize', code: 'Sequelize.literal(`name LIKE "${term}%"`);', errors },
    { name: 'one branch built', code: "database.query(all ? 'SELECT 1' : `SELECT ${one}`);", errors },
    {
      name: 'built SQL wherever it goes',
      code: 'export const byName = (name: string) => `SELECT id FROM jobs WHERE name = ${name}`;',
      errors,
    },
    {
      name: 'built SQL by plus wherever it goes',
      code: "run('UPDATE jobs SET name = ' + name + ' WHERE id = 1');",
      errors,
    },
  ],
});
