/** Name of the constraint a write broke by repeating what must be unique, or undefined for any other failure. */
export function brokenUnique(error: unknown): string | undefined {
  for (let each = error; each instanceof Error; each = each.cause) {
    if ('code' in each && each.code === '23505' && 'constraint' in each)
      return String(each.constraint);
  }
  return undefined;
}
