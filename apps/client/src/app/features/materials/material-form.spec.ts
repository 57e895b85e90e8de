import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router, withComponentInputBinding } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { MaterialForm } from './material-form';

@Component({ selector: 'app-page', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

const ORIGIN = { provenance: 'certificate', note: '4711' };
const MATERIAL = {
  id: 'm1',
  version: 4,
  updatedAt: '2026-01-06T08:11:00Z',
  components: 2,
  name: 'A516-70',
  specification: 'ASME SA-516',
  heatNo: 'S6120',
  yieldMpa: 285,
  tensileMpa: 510,
  youngsModulusMpa: 207000,
  poissonsRatio: 0.3,
  toughnessMpaSqrtM: 90,
  toughnessTemperatureC: 20,
  yieldPlateau: false,
  origins: {
    yieldMpa: ORIGIN,
    tensileMpa: ORIGIN,
    youngsModulusMpa: ORIGIN,
    poissonsRatio: ORIGIN,
    toughnessMpaSqrtM: ORIGIN,
  },
};

describe('MaterialForm', () => {
  it('changes a material by the version that was seen, with the origin of each property', async () => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter(
          [
            { path: 'materials/:id/change', component: MaterialForm },
            { path: 'materials/:id', component: Page },
          ],
          withComponentInputBinding(),
        ),
      ],
    });
    const server = TestBed.inject(HttpTestingController);
    const harness = await RouterTestingHarness.create('/materials/m1/change');
    await harness.fixture.whenStable();
    server.expectOne('/api/materials/m1').flush(MATERIAL);
    await harness.fixture.whenStable();
    const page = harness.routeNativeElement as HTMLElement;
    expect(page.querySelector('.notice')?.textContent).toContain('2 components');
    const reason = page.querySelector<HTMLTextAreaElement>('textarea');
    if (!reason) throw new Error('no reason asked');
    reason.value = 'The certificate was found.';
    reason.dispatchEvent(new Event('input'));
    page.querySelector<HTMLButtonElement>('button[type=submit]')?.click();
    const sent = server.expectOne({ method: 'PATCH', url: '/api/materials/m1' });
    expect(sent.request.headers.get('If-Match')).toBe('"4"');
    expect(sent.request.body).toMatchObject({
      yieldMpa: 285,
      yieldPlateau: false,
      origins: MATERIAL.origins,
      reason: 'The certificate was found.',
    });
    expect(Object.keys(sent.request.body as object)).not.toContain('version');
    // somebody else was faster: told, and the second save goes on top of theirs
    const current = { ...MATERIAL, version: 5, tensileMpa: 505 };
    sent.flush(
      { type: 'urn:ligament:stale', title: 'Changed', detail: 'Meanwhile.', current },
      { status: 412, statusText: 'Precondition Failed' },
    );
    await harness.fixture.whenStable();
    expect(page.querySelector('[role=alert]')?.textContent).toContain('510 → 505');
    page.querySelector<HTMLButtonElement>('button[type=submit]')?.click();
    const again = server.expectOne({ method: 'PATCH', url: '/api/materials/m1' });
    expect(again.request.headers.get('If-Match')).toBe('"5"');
    expect(again.request.body).toMatchObject({ tensileMpa: 505 });
    again.flush({ ...current, version: 6 });
    await harness.fixture.whenStable();
    expect(TestBed.inject(Router).url).toBe('/materials/m1');
  });
});
