import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { sessionOf } from '../../testing/session-of';
import { actionGuard } from './action-guard';
import { Session } from './session';
import { signedInGuard } from './signed-in-guard';

@Component({
  selector: 'app-page',
  template: '<h1>page</h1>',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {}

describe('the guards of a page', () => {
  let server: HttpTestingController;

  beforeEach(() => {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([
          { path: 'sign-in', component: Page },
          { path: 'not-allowed', component: Page },
          { path: 'flaws/:id', component: Page, canActivate: [signedInGuard] },
          {
            path: 'people',
            component: Page,
            canActivate: [signedInGuard, actionGuard('people.read')],
          },
        ]),
      ],
    });
    server = TestBed.inject(HttpTestingController);
  });

  async function goTo(address: string, answer: () => void): Promise<string> {
    const harness = await RouterTestingHarness.create();
    const going = harness.navigateByUrl(address);
    await new Promise((resolve) => setTimeout(resolve));
    answer();
    await going;
    return TestBed.inject(Router).url;
  }

  it('send somebody unknown to the sign-in, with the way back', async () => {
    const url = await goTo('/flaws/7?tab=growth', () =>
      server.expectOne('/api/session').flush(null, { status: 401, statusText: 'x' }),
    );
    expect(url).toBe('/sign-in?next=%2Fflaws%2F7%3Ftab%3Dgrowth');
  });

  it('let a signed-in person in', async () => {
    const url = await goTo('/flaws/7', () =>
      server.expectOne('/api/session').flush(sessionOf('auditor')),
    );
    expect(url).toBe('/flaws/7');
  });

  it('explain a page that the role does not include', async () => {
    TestBed.inject(Session).remember(sessionOf('inspector'));
    expect(await goTo('/people', () => server.verify())).toBe('/not-allowed');
  });

  it('open a page that the role includes', async () => {
    TestBed.inject(Session).remember(sessionOf('administrator'));
    expect(await goTo('/people', () => server.verify())).toBe('/people');
  });
});
