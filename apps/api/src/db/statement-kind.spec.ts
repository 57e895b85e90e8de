import { isAllowed, mayWrite } from './statement-kind';

describe('isAllowed', () => {
  it.each([
    'select 1',
    'SELECT current_user',
    '(select 1) union (select 2)',
    'insert into "people" ("role") values ($1)',
    'update "people" set "role" = $1 where "id" = $2',
    'update people set role = $1',
    'delete from "sessions"',
    'with due as (select 1) select * from due',
    'begin',
    'commit',
    'rollback to savepoint sp1',
    'savepoint sp1',
    'release savepoint sp1',
    'set transaction isolation level serializable',
    '/* list */ -- due\n select 1',
  ])('lets the application send %s', (sql) => {
    expect(isAllowed(sql)).toBe(true);
  });

  it.each([
    'reset role',
    'RESET ALL',
    'set role postgres',
    'set "role" to postgres',
    'set local role postgres',
    'set session authorization postgres',
    'reset session authorization',
    'discard all',
    '/**/reset/**/role',
    '-- x\nset role postgres',
    "do $$ begin execute 'reset role'; end $$",
    "select set_config('role', 'postgres', false)",
    `select SET_CONFIG('role', 'postgres', false)`,
    `select U&"set\\005fconfig"('role', 'postgres', false)`,
    "copy people from program 'id'",
    "copy people to '/tmp/people'",
    'alter table history disable trigger all',
    'drop table history',
    'create function f() returns int language sql as $$ select 1 $$',
    'set session_replication_role = replica',
    'truncate history',
    'vacuum',
    "prepare p as copy people from program 'id'",
    'execute p',
    'selection',
    '',
  ])('refuses %s', (sql) => {
    expect(isAllowed(sql)).toBe(false);
  });
});

describe('mayWrite', () => {
  it.each([
    'insert into t values (1)',
    'with x as (delete from t returning *) select * from x',
    'create table t ()',
  ])('takes %s for a write', (sql) => expect(mayWrite(sql)).toBe(true));

  it.each(['select 1', 'with x as (select 1) select * from x', 'begin', 'rollback', '(select 1)'])(
    'takes %s for a read',
    (sql) => expect(mayWrite(sql)).toBe(false),
  );
});
