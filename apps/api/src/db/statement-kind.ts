/** Comments and brackets before the first word. */
const LEADING = /^(?:\s|\(|--[^\n]*(?:\n|$)|\/\*[\s\S]*?\*\/)+/;

const ALLOWED =
  /^(?:select|insert|update|delete|merge|with|values|explain|begin|commit|rollback|savepoint|release|set\s+transaction)\b/i;

/** A setting changed by function would give superuser rights back; the escape could spell its name unseen. */
const DISGUISED = /set_config|\bu&["']/i;

const WRITES = /\b(?:insert|update|delete|merge)\b/i;
const READS = /^(?:select|values|explain|begin|commit|rollback|savepoint|release|set)\b/i;

/**
 * Whether the application may send a statement. A list of what is allowed, because the ways back to superuser rights
 * (`reset role`, `do`, `discard all` …) are many, and one statement (`copy … from program`) would hang the engine for ever.
 */
export function isAllowed(sql: string): boolean {
  return ALLOWED.test(sql.replace(LEADING, '')) && !DISGUISED.test(sql);
}

/** Whether a statement may need room on the disk; in doubt it does. */
export function mayWrite(sql: string): boolean {
  const statement = sql.replace(LEADING, '');
  if (/^with\b/i.test(statement)) return WRITES.test(statement);
  return !READS.test(statement);
}
