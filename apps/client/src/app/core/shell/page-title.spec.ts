import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { Title } from '@angular/platform-browser';
import { provideRouter, TitleStrategy } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { PageTitle } from './page-title';

@Component({ selector: 'app-page', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

describe('PageTitle', () => {
  it('names the page and the product', async () => {
    TestBed.configureTestingModule({
      providers: [
        provideRouter([
          { path: 'flaws', title: 'Flaws', component: Page },
          { path: 'bare', component: Page },
        ]),
        { provide: TitleStrategy, useExisting: PageTitle },
      ],
    });
    const harness = await RouterTestingHarness.create('/flaws');
    expect(TestBed.inject(Title).getTitle()).toBe('Flaws · Ligament');
    await harness.navigateByUrl('/bare');
    expect(TestBed.inject(Title).getTitle()).toBe('Ligament');
  });
});
