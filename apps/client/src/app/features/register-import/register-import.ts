import { ChangeDetectionStrategy, Component, computed, inject, signal } from '@angular/core';
import { MatButtonModule } from '@angular/material/button';
import { Router } from '@angular/router';
import {
  commitRegister,
  previewRegister,
  type RegisterPreview,
  registerTemplate,
} from '@ligament/domain/contract/register-import';
import { ApiClient } from '../../core/http/api-client';
import { type Problem, problemOf } from '../../core/http/problem';
import { Chip } from '../../shared/chips/chip';
import { FileDrop } from '../../shared/files/file-drop';
import { PageHeader } from '../../shared/page-header/page-header';
import { ProblemNotice } from '../../shared/problem/problem-notice';

/** A table of components: read, checked row by row, and added as a whole. */
@Component({
  selector: 'app-register-import',
  imports: [MatButtonModule, Chip, FileDrop, PageHeader, ProblemNotice],
  templateUrl: './register-import.html',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
export class RegisterImport {
  private readonly api = inject(ApiClient);
  private readonly router = inject(Router);
  protected readonly template = registerTemplate.path;
  protected readonly problem = signal<Problem | null>(null);
  protected readonly preview = signal<RegisterPreview | null>(null);
  protected readonly counts = computed(() => {
    const rows = this.preview()?.rows ?? [];
    const of = (state: string) => rows.filter((row) => row.state === state).length;
    return {
      added: of('new'),
      known: of('already in the register'),
      refused: of('cannot be taken'),
    };
  });
  protected readonly ready = computed(
    () =>
      this.counts().added > 0 &&
      this.counts().refused === 0 &&
      this.preview()?.problems.length === 0,
  );

  protected read(file: File): void {
    const body = new FormData();
    body.set('file', file, file.name);
    this.api.call(previewRegister, { body }).subscribe({
      next: (preview) => {
        this.problem.set(null);
        this.preview.set(preview);
      },
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected commit({ fileName, csv }: RegisterPreview): void {
    this.api.call(commitRegister, { body: { fileName, csv } }).subscribe({
      next: () => void this.router.navigate(['/register']),
      error: (error: unknown) => this.problem.set(problemOf(error)),
    });
  }

  protected word(state: string): string {
    return state === 'new' ? 'done' : state === 'cannot be taken' ? 'stop' : 'note';
  }
}
