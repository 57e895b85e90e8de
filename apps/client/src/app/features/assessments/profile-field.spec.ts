import { TestBed } from '@angular/core/testing';
import { ProfileField } from './profile-field';

async function field(value: readonly number[]) {
  const fixture = TestBed.createComponent(ProfileField);
  fixture.componentRef.setInput('path', 'stress.primaryProfileMPa');
  fixture.componentRef.setInput('given', { value, provenance: 'measured', note: 'analysis 12' });
  const emitted: unknown[] = [];
  fixture.componentInstance.changed.subscribe((each) => emitted.push(each));
  await fixture.whenStable();
  const element = fixture.nativeElement as HTMLElement;
  const inputs = [...element.querySelectorAll<HTMLInputElement>('input[type=number]')];
  const type = (place: number, text: string) => {
    const input = inputs[place] as HTMLInputElement;
    input.value = text;
    input.dispatchEvent(new Event('change'));
  };
  return { fixture, element, inputs, emitted, type };
}

describe('the field for a stress polynomial', () => {
  it('shows one coefficient a degree and leaves the missing ones empty', async () => {
    const { inputs } = await field([120, -40]);
    expect(inputs.map(({ value }) => value)).toEqual(['120', '-40', '', '', '']);
  });

  it('keeps what lies between when a higher degree is filled in', async () => {
    const { type, emitted } = await field([120]);
    type(2, '15');
    expect(emitted).toEqual([{ value: [120, 0, 15], provenance: 'measured', note: 'analysis 12' }]);
  });

  it('drops the highest degree when it becomes zero', async () => {
    const { type, emitted } = await field([120, -40]);
    type(1, '0');
    expect(emitted[0]).toMatchObject({ value: [120] });
  });

  it('reads as a polynomial once it cannot be changed', async () => {
    const { fixture, element } = await field([120, -40, 3]);
    fixture.componentRef.setInput('readOnly', true);
    await fixture.whenStable();
    expect(element.textContent).toContain('120 + −40 x/t + 3 (x/t)^2 MPa');
  });
});
