import { inject, Injectable } from '@angular/core';
import { listComponents, readComponent } from '@ligament/domain/contract/components';
import { addFinding, listFindings } from '@ligament/domain/contract/findings';
import * as imports from '@ligament/domain/contract/imports';
import * as inspections from '@ligament/domain/contract/inspections';
import type { BodyOf, QueryOf } from '@ligament/domain/contract/route';
import { map } from 'rxjs';
import { ApiClient } from '../../core/http/api-client';

export type Step = 'submit' | 'accept' | 'reject' | 'void';

/** Inspections, their files, their findings and the import of an inspector's table. */
@Injectable({ providedIn: 'root' })
export class InspectionsClient {
  private readonly api = inject(ApiClient);

  list(query: QueryOf<typeof inspections.listInspections>) {
    return this.api.call(inspections.listInspections, { query });
  }

  read(id: string) {
    return this.api.call(inspections.readInspection, { params: { id } });
  }

  add(componentId: string, body: BodyOf<typeof inspections.addInspection>) {
    return this.api.call(inspections.addInspection, { params: { id: componentId }, body });
  }

  change(id: string, version: number, body: BodyOf<typeof inspections.changeInspection>) {
    return this.api.call(inspections.changeInspection, { params: { id }, version, body });
  }

  move(step: Step, id: string, version: number, reason: string) {
    switch (step) {
      case 'submit':
        return this.api.call(inspections.submitInspection, { params: { id }, version, body: {} });
      case 'accept':
        return this.api.call(inspections.acceptInspection, { params: { id }, version, body: {} });
      case 'reject':
        return this.api.call(inspections.rejectInspection, {
          params: { id },
          version,
          body: { reason },
        });
      case 'void':
        return this.api.call(inspections.voidInspection, {
          params: { id },
          version,
          body: { reason },
        });
    }
  }

  attach(id: string, file: File) {
    return this.api.call(inspections.addDocument, { params: { id }, body: formOf(file) });
  }

  documentAddress(id: string) {
    return this.api.address(inspections.downloadDocument, { id });
  }

  findings(inspectionId: string) {
    return this.api
      .call(listFindings, { query: { inspection: inspectionId, limit: 200 } })
      .pipe(map(({ rows }) => rows));
  }

  addFinding(inspectionId: string, body: BodyOf<typeof addFinding>) {
    return this.api.call(addFinding, { params: { id: inspectionId }, body });
  }

  component(id: string) {
    return this.api.call(readComponent, { params: { id } });
  }

  components(search: string) {
    return this.api
      .call(listComponents, { query: { search, limit: 50 } })
      .pipe(map(({ rows }) => rows));
  }

  startImport(inspectionId: string, file: File) {
    return this.api.call(imports.startImport, { params: { id: inspectionId }, body: formOf(file) });
  }

  readImport(id: string) {
    return this.api.call(imports.readImport, { params: { id } });
  }

  changeImport(id: string, version: number, body: BodyOf<typeof imports.changeImport>) {
    return this.api.call(imports.changeImport, { params: { id }, version, body });
  }

  commitImport(id: string) {
    return this.api.call(imports.commitImport, { params: { id }, body: {} });
  }

  discardImport(id: string) {
    return this.api.call(imports.discardImport, { params: { id }, body: {} });
  }

  problemsAddress(id: string) {
    return this.api.address(imports.exportProblems, { id });
  }
}

function formOf(file: File): FormData {
  const form = new FormData();
  form.set('file', file, file.name);
  return form;
}
