import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { MatMenuHarness } from '@angular/material/menu/testing';
import { provideRouter, Router } from '@angular/router';
import type { Role } from '@ligament/domain/contract/policy';
import { sessionOf } from '../../testing/session-of';
import { ErrorReporter } from '../errors/error-reporter';
import { Session } from '../session/session';
import { Shell } from './shell';

@Component({ selector: 'app-page', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

describe('Shell', () => {
  let fixture: ComponentFixture<Shell>;
  let page: HTMLElement;

  async function open(role: Role, demo = false): Promise<void> {
    TestBed.configureTestingModule({
      providers: [
        provideHttpClient(),
        provideHttpClientTesting(),
        provideRouter([{ path: '**', component: Page }]),
      ],
    });
    TestBed.inject(Session).remember(sessionOf(role, demo));
    fixture = TestBed.createComponent(Shell);
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  }

  const words = (selector: string) =>
    [...page.querySelectorAll(selector)].map((each) => each.textContent?.trim());

  it('offers an inspector the daily pages and no administration', async () => {
    await open('inspector');
    expect(words('#rail a')).toEqual([
      'Today',
      'Register',
      'Inspections',
      'Flaws',
      'Schedule',
      'History',
      'Materials',
      'Growth laws',
      'Checks',
      'Site rules',
    ]);
    expect(words('#rail .heading')).toEqual(['Site lists']);
  });

  it('offers an administrator people and the mailbox too', async () => {
    await open('administrator');
    expect(words('#rail .heading')).toEqual(['Site lists', 'Administration']);
    expect(words('#rail a')).toEqual(expect.arrayContaining(['People', 'Mailbox']));
  });

  it('keeps the nearest pages within reach of the thumb', async () => {
    await open('planner');
    expect(words('.thumb a')).toEqual(['Today', 'Inspections', 'Flaws', 'Schedule']);
  });

  it('names the site, the units and the person', async () => {
    await open('engineer');
    expect(words('.site')).toEqual(['Saltmere Works']);
    expect(words('.units')).toEqual(['mm, MPa, °C']);
    expect(page.querySelector('.person')?.getAttribute('aria-label')).toBe(
      'Signed in as Ada Quill',
    );
    expect(words('.person')).toEqual(['AQ']);
  });

  it('says that it does not certify, and when the plant is invented', async () => {
    await open('engineer', true);
    expect(page.querySelector('footer')?.textContent).toContain('it does not certify');
    expect(page.querySelector('.ribbon')?.textContent).toContain('invented plant');
  });

  it('shows no ribbon on a real site', async () => {
    await open('engineer');
    expect(page.querySelector('.ribbon')).toBeNull();
  });

  it('brings the focus to the page by the skip link', async () => {
    await open('engineer');
    document.body.append(page);
    page.querySelector<HTMLElement>('.skip')?.click();
    expect(document.activeElement).toBe(page.querySelector('main'));
  });

  it('opens the rail as a drawer and closes it with Escape', async () => {
    await open('engineer');
    const toggle = page.querySelector<HTMLButtonElement>('.rail-toggle');
    toggle?.click();
    await fixture.whenStable();
    expect(toggle?.getAttribute('aria-expanded')).toBe('true');
    document.dispatchEvent(new KeyboardEvent('keydown', { key: 'Escape' }));
    await fixture.whenStable();
    expect(toggle?.getAttribute('aria-expanded')).toBe('false');
  });

  it('signs out from the person’s menu', async () => {
    await open('engineer');
    const menu = await TestbedHarnessEnvironment.loader(fixture).getHarness(MatMenuHarness);
    await menu.open();
    await menu.clickItem({ text: 'Sign out' });
    TestBed.inject(HttpTestingController)
      .expectOne({ method: 'DELETE', url: '/api/session' })
      .flush(null);
    await fixture.whenStable();
    expect(TestBed.inject(Session).user()).toBeNull();
    expect(TestBed.inject(Router).url).toBe('/sign-in');
  });

  it('shows an error of the page until it is dismissed', async () => {
    await open('engineer');
    TestBed.inject(ErrorReporter).last.set('The map could not be drawn');
    await fixture.whenStable();
    const notice = page.querySelector('main [role=alert]');
    expect(notice?.textContent).toContain('The map could not be drawn');
    notice?.querySelector('button')?.click();
    await fixture.whenStable();
    expect(page.querySelector('main [role=alert]')).toBeNull();
  });
});
