import {
  commitRegister,
  previewRegister,
  registerTemplate,
} from '@ligament/domain/contract/register-import';
import { decodeText } from '@ligament/domain/inspection/decode-text';
import type { Deps } from '../../deps';
import { answerCsv } from '../../http/csv-answer';
import { Failure, unacceptable } from '../../http/failure';
import { refuseRepeat } from '../../http/refuse-repeat';
import type { Api } from '../../http/serve';
import { receivedFile, receiveFile } from '../../http/upload';
import { insertComponent } from '../components/add-component';
import { readRegister } from './read-register';
import { REGISTER_COLUMNS } from './register-columns';
import { registerNames } from './register-names.repository';

/** A table this long still fits into the answer that is sent back to commit it. */
const MOST_CHARACTERS = 240_000;

/** Import of a register: read, checked, and added as a whole. */
export function serveRegisterImports(api: Api, { db, clock, config }: Deps): void {
  api.serve(
    previewRegister,
    async ({ actor, request }) => {
      const file = receivedFile(request);
      const decoded = decodeText(file.bytes);
      if (decoded.state === 'refused') {
        throw unacceptable(
          'register-import.not-text',
          `This is ${decoded.what}, not a text file. Save the table as CSV (UTF-8).`,
          'file',
        );
      }
      const csv = decoded.decoded.text;
      if (csv.length > MOST_CHARACTERS) {
        throw unacceptable(
          'register-import.too-large',
          'The table is longer than 240 000 characters. Split it.',
          'file',
        );
      }
      const { preview } = readRegister(csv, await registerNames(db, actor.siteId));
      return { ...preview, fileName: file.name, csv };
    },
    receiveFile(config.uploadBytes),
  );

  const taken = 'Somebody else has just added one of these components. Read the file again.';
  api.serve(commitRegister, ({ actor, body }) =>
    refuseRepeat('components_tag', 'tag', taken, () =>
      db.transaction(async (tx) => {
        const { preview, components } = readRegister(
          body.csv,
          await registerNames(tx, actor.siteId),
        );
        const errors = [
          ...preview.problems.map((message) => ({ field: 'file', message })),
          ...preview.rows.flatMap(({ problems }) =>
            problems.map(({ row, column, message }) => ({
              field: `row ${row}, ${column}`,
              message,
            })),
          ),
        ];
        if (errors.length > 0 || components.length === 0) {
          throw new Failure(
            'register-import.not-ready',
            422,
            'Not ready to add',
            errors.length > 0
              ? 'Some rows cannot be taken; nothing was added.'
              : 'No row is new; nothing was added.',
            { errors },
          );
        }
        const now = clock.now();
        for (const component of components) await insertComponent(tx, actor, now, component);
        return {
          added: components.map(({ tag }) => tag),
          leftAlone: preview.rows
            .filter(({ state }) => state === 'already in the register')
            .map(({ tag }) => tag),
        };
      }),
    ),
  );

  api.stream(registerTemplate, async ({ response }) => {
    await answerCsv(
      response,
      'register template.csv',
      REGISTER_COLUMNS.map(({ header }) => header),
      [],
    );
  });
}
