import * as contract from '@ligament/domain/contract/imports';
import { FINDING_FIELDS } from '@ligament/domain/inspection/finding-fields';
import type { Deps } from '../../deps';
import { answerCsv } from '../../http/csv-answer';
import { notFound } from '../../http/failure';
import { etag, type Api } from '../../http/serve';
import { receivedFile, receiveFile } from '../../http/upload';
import { todayAt } from '../site/site-clock';
import { changeImport } from './change-import';
import { commitImport } from './commit-import';
import { discardImport } from './discard-import';
import { readImportView } from './import-view';
import { startImport } from './start-import';

/** Import of an inspector's file: read, checked, corrected, and committed as a whole. */
export function serveImports(api: Api, deps: Deps): void {
  const { db, clock, config } = deps;
  const view = async (siteId: string, id: string) =>
    readImportView(db, siteId, id, await todayAt(db, clock, siteId));

  api.serve(
    contract.startImport,
    async ({ actor, params, request, response }) => {
      const started = await startImport(deps, actor, params.id, receivedFile(request));
      response.setHeader('ETag', etag(started.version));
      return started;
    },
    receiveFile(config.uploadBytes),
  );

  api.serve(contract.readImport, async ({ actor, params, response }) => {
    const read = await view(actor.siteId, params.id);
    response.setHeader('ETag', etag(read.version));
    return read;
  });

  api.serve(contract.changeImport, async ({ actor, params, body, seen, response }) => {
    const changed = await changeImport(deps, actor, params.id, seen, body);
    response.setHeader('ETag', etag(changed.version));
    return changed;
  });

  api.serve(contract.commitImport, ({ actor, params }) => commitImport(deps, actor, params.id));
  api.serve(contract.discardImport, ({ actor, params }) => discardImport(deps, actor, params.id));

  api.stream(contract.exportProblems, async ({ actor, params, response }) => {
    const read = await view(actor.siteId, params.id);
    if (read.rows.length === 0) throw notFound('import');
    const problems = [...read.problems, ...read.rows.flatMap((row) => row.problems)];
    await answerCsv(
      response,
      `problems of ${read.fileName}.csv`,
      ['line', 'column', 'text', 'level', 'what to do'],
      problems.map(({ row, field, original, level, message }) => [
        row,
        field ?? '',
        original,
        level,
        message,
      ]),
    );
  });

  api.stream(contract.downloadTemplate, async ({ response }) => {
    const header = FINDING_FIELDS.map(
      ({ kind, synonyms }) => `${synonyms[0] ?? ''}${kind === 'length' ? ' [mm]' : ''}`,
    );
    await answerCsv(response, 'findings template.csv', header, []);
  });
}
