import { TestBed } from '@angular/core/testing';
import type { AssessmentInput } from '@ligament/domain/assessment/assessment-input';
import { sampleInput } from '@ligament/domain/assessment/testing/sample-input';
import { FactorFields } from './factor-fields';
import { SolutionChoice } from './solution-choice';

async function shown<T extends SolutionChoice | FactorFields>(
  kind: new (...none: never[]) => T,
  input: AssessmentInput,
  readOnly = false,
) {
  const fixture = TestBed.createComponent<T>(kind);
  fixture.componentRef.setInput('input', input);
  fixture.componentRef.setInput('readOnly', readOnly);
  const emitted: AssessmentInput[] = [];
  fixture.componentInstance.changed.subscribe((each) => emitted.push(each));
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const set = (selector: string, value: string, place = 0) => {
    const field = element.querySelectorAll<HTMLInputElement>(selector)[place];
    if (!field) throw new Error(`no ${selector}`);
    field.value = value;
    field.dispatchEvent(new Event('change'));
  };
  return { element, emitted, set };
}

const shell = sampleInput({ insideDiameter: 2600 });

describe('the choice of solutions', () => {
  it('offers what the catalogue has, the governing one first', async () => {
    const { element } = await shown(SolutionChoice, shell);
    const options = [...element.querySelectorAll('option')].map(({ textContent }) =>
      textContent.trim(),
    );
    expect(options[0]).toMatch(/\(governs\)$/);
    expect(options).toHaveLength(2);
  });

  it('keeps another choice and asks for its reason', async () => {
    const { emitted, set } = await shown(SolutionChoice, shell);
    set('select', 'cylinder-axial-api');
    expect(emitted[0]?.referenceStressChoice).toEqual({ key: 'cylinder-axial-api', reason: '' });
    const asked = await shown(SolutionChoice, emitted[0] ?? shell);
    asked.set('input', 'shell analysis SA-12');
    expect(asked.emitted[0]?.referenceStressChoice?.reason).toBe('shell analysis SA-12');
  });

  it('takes the choice away when the governing one is chosen again', async () => {
    const choice = { key: 'cylinder-axial-api', reason: 'test' };
    const { emitted, set } = await shown(SolutionChoice, {
      ...shell,
      referenceStressChoice: choice,
    });
    set('select', 'cylinder-axial');
    expect(emitted[0]?.referenceStressChoice).toBeNull();
  });

  it('reads as text once it cannot be changed', async () => {
    const choice = { key: 'cylinder-axial-api', reason: 'shell analysis SA-12' };
    const { element } = await shown(
      SolutionChoice,
      { ...shell, referenceStressChoice: choice },
      true,
    );
    expect(element.querySelector('select')).toBeNull();
    expect(element.textContent).toContain('chosen: shell analysis SA-12');
  });
});

describe('partial factors', () => {
  it('start at one and change one at a time', async () => {
    const off = await shown(FactorFields, shell);
    const tick = off.element.querySelector<HTMLInputElement>('input[type=checkbox]');
    tick?.click();
    const [on] = off.emitted;
    expect(on?.partialFactors).toMatchObject({ stress: 1, size: 1, toughness: 1, yield: 1 });
    const fields = await shown(FactorFields, on ?? shell);
    fields.set('input[type=number]', '1.3', 2);
    expect(fields.emitted[0]?.partialFactors).toMatchObject({ toughness: 1.3, stress: 1 });
  });

  it('say that there are none', async () => {
    const { element } = await shown(FactorFields, shell, true);
    expect(element.textContent).toContain('none');
  });
});
