import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import type { Role } from '@ligament/domain/contract/policy';
import type { ComponentView } from '@ligament/domain/contract/components';
import { Session } from '../../core/session/session';
import { sessionOf } from '../../testing/session-of';
import { ComponentParts } from './component-parts';

const ORIGIN = { provenance: 'assumed', note: 'no stress analysis' } as const;
const COMPONENT = {
  id: 'c1',
  locations: [],
  loadCases: [
    {
      id: 'l1',
      componentId: 'c1',
      version: 3,
      name: 'Normal operation',
      kind: 'operating',
      pressureMpa: 2.5,
      temperatureC: 40,
      hoopMembraneMpa: 66.5,
      hoopBendingMpa: 0,
      axialMembraneMpa: 32,
      axialBendingMpa: 0,
      origins: {
        hoopMembraneMpa: { provenance: 'measured', note: '' },
        hoopBendingMpa: ORIGIN,
        axialMembraneMpa: ORIGIN,
        axialBendingMpa: ORIGIN,
      },
    },
  ],
  operatingCycles: [
    {
      id: 'o1',
      componentId: 'c1',
      version: 1,
      loadCaseId: 'l1',
      name: 'Adsorption cycle',
      rangeFraction: 0.9,
      countPerYear: 52000,
      source: 'historian',
      periodFrom: null,
      periodTo: null,
    },
  ],
} as unknown as ComponentView;

describe('ComponentParts', () => {
  let fixture: ComponentFixture<ComponentParts>;
  let page: HTMLElement;
  let changes: number;

  async function open(role: Role): Promise<void> {
    TestBed.configureTestingModule({
      providers: [provideHttpClient(), provideHttpClientTesting()],
    });
    TestBed.inject(Session).remember(sessionOf(role));
    fixture = TestBed.createComponent(ComponentParts);
    fixture.componentRef.setInput('component', COMPONENT);
    changes = 0;
    fixture.componentInstance.changed.subscribe(() => changes++);
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  }

  async function press(label: string): Promise<void> {
    [...page.querySelectorAll('button')]
      .find((each) => each.textContent?.replace(/\s+/g, ' ').trim() === label)
      ?.click();
    await fixture.whenStable();
  }

  function type(label: string, value: string): void {
    const id = [...page.querySelectorAll('label')].find(
      (each) => each.textContent === label,
    )?.htmlFor;
    const field = page.querySelector<HTMLInputElement>(`#${id}`);
    if (!field) throw new Error(`no field ${label}`);
    field.value = value;
    field.dispatchEvent(new Event('input'));
  }

  it('shows where each stress comes from; what is assumed stands out', async () => {
    await open('auditor');
    expect(page.querySelectorAll('app-provenance .assumed')).toHaveLength(3);
    expect(page.textContent).toContain('52\u202f000');
    expect(page.textContent).toContain('Normal operation');
  });

  it('offers a reader nothing to change', async () => {
    await open('auditor');
    expect(page.querySelectorAll('button')).toHaveLength(0);
  });

  it('adds a location', async () => {
    await open('engineer');
    await press('Add a location');
    type('Name, as on the drawing', 'L1');
    type('Datum: where positions are measured from', 'north meridian, tangent line');
    await press('Save');
    const sent = TestBed.inject(HttpTestingController).expectOne('/api/components/c1/locations');
    expect(sent.request.body).toMatchObject({
      name: 'L1',
      circumferenceOn: 'inside',
      heatTreatment: null,
      lengthMm: null,
    });
    sent.flush({});
    await fixture.whenStable();
    expect(changes).toBe(1);
    expect(page.querySelector('app-part-editor')).toBeNull();
  });

  it('changes a load case by the version that was seen, with a reason', async () => {
    await open('engineer');
    await press('Change Normal operation');
    type('Pressure, MPa', '2.6');
    type('Reason for the change', 'New set pressure of the relief valve.');
    await press('Save');
    const sent = TestBed.inject(HttpTestingController).expectOne('/api/load-cases/l1');
    expect(sent.request.method).toBe('PATCH');
    expect(sent.request.headers.get('If-Match')).toBe('"3"');
    expect(sent.request.body).toMatchObject({
      pressureMpa: 2.6,
      reason: 'New set pressure of the relief valve.',
      origins: { hoopMembraneMpa: { provenance: 'measured', note: '' } },
    });
  });

  it('keeps the form open when somebody else changed it meanwhile', async () => {
    await open('engineer');
    await press('Change Normal operation');
    type('Reason for the change', 'New set pressure.');
    await press('Save');
    TestBed.inject(HttpTestingController)
      .expectOne('/api/load-cases/l1')
      .flush(
        { title: 'Changed meanwhile', detail: 'Read it again.' },
        { status: 412, statusText: 'x' },
      );
    await fixture.whenStable();
    expect(page.querySelector('[role=alert]')?.textContent).toContain('Changed meanwhile');
    expect(changes).toBe(0);
  });
});
