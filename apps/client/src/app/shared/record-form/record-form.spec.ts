import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { above0, line, optionalLine } from '@ligament/domain/contract/primitives';
import * as z from 'zod';
import { choice, choicesOf, date, given, text } from './record-field';
import { RecordForm, type SavedRecord } from './record-form';
import type { RecordValue } from './record-group';

const FIELDS = [
  text('name', 'Name'),
  choice('kind', 'Kind', choicesOf(['plate', 'pipe'])),
  given('yieldMpa', 'Yield, MPa'),
  date('since', 'Since'),
];
const CHECKS = {
  name: line(40),
  kind: z.enum(['plate', 'pipe']),
  yieldMpa: above0(1500, 'MPa'),
  since: z.iso.date().nullable(),
  other: optionalLine(5),
};

describe('RecordForm', () => {
  let fixture: ComponentFixture<RecordForm>;
  let page: HTMLElement;
  let saved: RecordValue[];
  let versions: SavedRecord['version'][];

  async function open(inputs: Readonly<Record<string, unknown>> = {}): Promise<void> {
    fixture = TestBed.createComponent(RecordForm);
    Object.entries({ fields: FIELDS, checks: CHECKS, ...inputs }).forEach(([name, value]) =>
      fixture.componentRef.setInput(name, value),
    );
    [saved, versions] = [[], []];
    fixture.componentInstance.saved.subscribe(({ value, version }) => {
      saved.push(value);
      versions.push(version);
    });
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  }

  const field = (label: string) => {
    const named = page.querySelector<HTMLInputElement>(`[aria-label="${label}"]`);
    const id = [...page.querySelectorAll('label')].find(
      (each) => each.textContent === label,
    )?.htmlFor;
    const found = named ?? page.querySelector<HTMLInputElement>(`#${id}`);
    if (!found) throw new Error(`no field ${label}`);
    return found;
  };
  const type = (label: string, value: string) => {
    field(label).value = value;
    field(label).dispatchEvent(new Event('input'));
  };
  const send = async () => {
    page.querySelector<HTMLButtonElement>('button[type=submit]')?.click();
    await fixture.whenStable();
  };
  const messages = () => [...page.querySelectorAll('.field-error')].map((each) => each.textContent);

  it('checks every field as the contract does', async () => {
    await open();
    type('Yield, MPa', '-5');
    await send();
    expect(messages()).toEqual(['Fill this in.', 'Must be above 0 MPa.']);
    expect(saved).toEqual([]);
  });

  it('gives the body with the origin of each value, and no date as none', async () => {
    await open();
    type('Name', 'A516-70');
    type('Yield, MPa', '285');
    type('Document or reason: Yield, MPa', 'certificate 4711, page 2');
    await send();
    expect(saved).toEqual([
      {
        name: 'A516-70',
        kind: 'plate',
        yieldMpa: 285,
        since: null,
        origins: { yieldMpa: { provenance: 'assumed', note: 'certificate 4711, page 2' } },
      },
    ]);
  });

  it('starts from what is recorded and asks why it changes', async () => {
    await open({
      start: {
        name: 'A516-70',
        kind: 'pipe',
        yieldMpa: 285,
        since: '2012-10-01',
        origins: { yieldMpa: { provenance: 'certificate', note: '4711' } },
      },
      asksReason: true,
    });
    expect(field('Name').value).toBe('A516-70');
    await send();
    expect(messages()).toEqual(['Give a reason in words.']);
    type('Reason for the change', 'The certificate was found.');
    await send();
    expect(saved[0]).toMatchObject({
      kind: 'pipe',
      since: '2012-10-01',
      origins: { yieldMpa: { provenance: 'certificate', note: '4711' } },
      reason: 'The certificate was found.',
    });
  });

  it('shows the server’s message beside its field and keeps what was typed', async () => {
    await open();
    type('Name', 'A516-70');
    fixture.componentRef.setInput('problem', {
      title: 'Not saved',
      detail: 'See below.',
      errors: [{ field: 'name', message: 'This name is taken.' }],
    });
    await fixture.whenStable();
    expect(messages()).toEqual(['This name is taken.']);
    expect(field('Name').value).toBe('A516-70');
  });

  it('takes over what somebody else changed, keeps what was typed, and tells both', async () => {
    const start = {
      name: 'A516-70',
      kind: 'plate',
      yieldMpa: 285,
      since: '2012-10-01',
      version: 4,
    };
    await open({ start, asksReason: true });
    type('Yield, MPa', '290');
    const current = { ...start, yieldMpa: 280, kind: 'pipe', version: 5 };
    const problem = { title: 'Changed', detail: 'Meanwhile.', errors: [], current };
    fixture.componentRef.setInput('problem', problem);
    await fixture.whenStable();
    const told = [...page.querySelectorAll('[role=alert] li')].map((each) =>
      each.textContent?.replaceAll(/\s+/g, ' ').trim(),
    );
    expect(told).toEqual([
      'Kind: plate → pipe. Taken over into this form.',
      'Yield, MPa: 285 → 280. Your entry 290 is kept.',
    ]);
    type('Reason for the change', 'Second certificate');
    await send();
    expect(versions).toEqual([5]);
    expect(saved[0]).toMatchObject({ name: 'A516-70', kind: 'pipe', yieldMpa: 290 });
  });

  it('fills fields from others, and says why it cannot', async () => {
    const fill = {
      label: 'From the name',
      values: ({ name }: RecordValue) => (name === '' ? 'Enter a name.' : { yieldMpa: 42 }),
    };
    await open({ fill });
    const press = async () => {
      [...page.querySelectorAll('button')]
        .find((each) => each.textContent === 'From the name')
        ?.click();
      await fixture.whenStable();
    };
    await press();
    expect(page.querySelector('[role=status]')?.textContent).toBe('Enter a name.');
    type('Name', 'A');
    await press();
    expect(field('Yield, MPa').value).toBe('42');
  });

  it('can be left without saving', async () => {
    await open();
    let left = 0;
    fixture.componentInstance.cancelled.subscribe(() => left++);
    page.querySelector<HTMLButtonElement>('button[type=button]')?.click();
    expect([left, saved.length]).toEqual([1, 0]);
  });
});
