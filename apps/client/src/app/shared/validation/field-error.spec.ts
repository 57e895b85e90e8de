import { ChangeDetectionStrategy, Component } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { FormControl, FormGroup, ReactiveFormsModule } from '@angular/forms';
import * as z from 'zod';
import { FieldError } from './field-error';
import { fits } from './fits';
import { showProblemOnForm } from './show-problem-on-form';

@Component({
  selector: 'app-page',
  imports: [ReactiveFormsModule, FieldError],
  template: `<p>
    <input [formControl]="form.controls.depthMm" /><app-field-error
      [control]="form.controls.depthMm"
    />
  </p>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {
  readonly form = new FormGroup({
    depthMm: new FormControl(0, [fits(z.number().gt(0, { error: 'Must be above 0 mm.' }))]),
  });
}

describe('the message of a field', () => {
  let fixture: ComponentFixture<Page>;
  let form: Page['form'];
  const field = () => (fixture.nativeElement as HTMLElement).querySelector('input');
  const message = () => (fixture.nativeElement as HTMLElement).querySelector('[role=alert]');

  beforeEach(async () => {
    fixture = TestBed.createComponent(Page);
    form = fixture.componentInstance.form;
    await fixture.whenStable();
  });

  it('waits until the field was touched', async () => {
    expect(message()).toBeNull();
    form.markAllAsTouched();
    await fixture.whenStable();
    expect(message()?.textContent).toBe('Must be above 0 mm.');
  });

  it('is tied to its field for a screen reader, and untied when all is well', async () => {
    form.markAllAsTouched();
    await fixture.whenStable();
    expect(field()?.getAttribute('aria-invalid')).toBe('true');
    expect(field()?.getAttribute('aria-describedby')).toBe(message()?.id);
    form.controls.depthMm.setValue(4.6);
    await fixture.whenStable();
    expect(message()).toBeNull();
    expect(field()?.getAttribute('aria-invalid')).toBe('false');
    expect(field()?.hasAttribute('aria-describedby')).toBe(false);
  });

  it('shows what the server refused, and keeps what was typed', async () => {
    form.controls.depthMm.setValue(40);
    showProblemOnForm(form, {
      errors: [
        { field: 'depthMm', message: 'Deeper than the wall, 32 mm.' },
        { field: 'unknown', message: 'not on this form' },
      ],
    });
    await fixture.whenStable();
    expect(message()?.textContent).toBe('Deeper than the wall, 32 mm.');
    expect(form.controls.depthMm.value).toBe(40);
    form.controls.depthMm.setValue(20);
    await fixture.whenStable();
    expect(message()).toBeNull();
  });

  it('has words for a check without any', async () => {
    form.controls.depthMm.setErrors({ required: true });
    form.markAllAsTouched();
    await fixture.whenStable();
    expect(message()?.textContent).toBe('Fill this in.');
    form.controls.depthMm.setErrors({ odd: true });
    await fixture.whenStable();
    expect(message()?.textContent).toBe('Check this value.');
  });
});
