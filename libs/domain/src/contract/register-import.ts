import * as z from 'zod';
import { line } from './primitives';
import { route } from './route';

export const registerRowProblem = z.object({
  row: z.number().int().describe('Line of the file, counted from 1'),
  column: z.string(),
  original: z.string(),
  message: z.string(),
});

export const registerRow = z.object({
  row: z.number().int(),
  tag: z.string(),
  description: z.string(),
  state: z.enum(['new', 'already in the register', 'cannot be taken']),
  problems: z.array(registerRowProblem),
});

export const registerPreview = z.object({
  fileName: z.string(),
  columns: z.array(z.object({ header: z.string(), known: z.boolean() })),
  rows: z.array(registerRow),
  problems: z.array(z.string()).describe('Of the file as a whole'),
  csv: z.string().describe('The text as it was read; sent back to commit it'),
});
export type RegisterPreview = z.infer<typeof registerPreview>;

export const previewRegister = route({
  method: 'post',
  path: '/api/register-imports',
  summary: 'Read a table of components and check every row; nothing is stored',
  access: 'register.write',
  upload: true,
  status: 200,
  response: registerPreview,
});

export const commitRegister = route({
  method: 'post',
  path: '/api/register-imports/commit',
  summary: 'Add every new component of a table, all or none; known tags are left as they are',
  access: 'register.write',
  body: z.strictObject({ fileName: line(150), csv: z.string().min(1).max(240_000) }),
  response: z.object({ added: z.array(z.string()), leftAlone: z.array(z.string()) }),
});

export const registerTemplate = route({
  method: 'get',
  path: '/api/register-template.csv',
  summary: 'A table with the columns of the register',
  access: 'register.read',
});
