import { jest } from '@jest/globals';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { FocusOnNavigation } from './focus-on-navigation';

@Component({
  selector: 'app-one',
  template: '<main><h1>One</h1></main>',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class One {}

@Component({
  selector: 'app-two',
  template: '<main><h1>Two</h1></main>',
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Two {}

const soon = () => new Promise((resolve) => setTimeout(resolve, 5));
const focused = () => document.activeElement?.textContent;

describe('FocusOnNavigation', () => {
  it('brings the focus to the heading of the next page, and leaves it while a filter changes', async () => {
    window.scrollTo = jest.fn();
    TestBed.configureTestingModule({
      providers: [
        provideRouter([
          { path: 'one', component: One },
          { path: 'two', component: Two },
        ]),
      ],
    });
    TestBed.inject(FocusOnNavigation);
    const harness = await RouterTestingHarness.create('/one');
    document.body.append(harness.fixture.nativeElement as HTMLElement);
    await soon();
    expect(document.activeElement).toBe(document.body);
    await harness.navigateByUrl('/two');
    await soon();
    expect(focused()).toBe('Two');
    (document.activeElement as HTMLElement).blur();
    await harness.navigateByUrl('/two?state=open');
    await soon();
    expect(document.activeElement).toBe(document.body);
  });
});
