import { TestBed } from '@angular/core/testing';
import { ThemeChoice } from './theme';

describe('ThemeChoice', () => {
  afterEach(() => {
    localStorage.clear();
    delete document.documentElement.dataset['theme'];
  });

  it('follows the system until somebody chooses', () => {
    const choice = TestBed.inject(ThemeChoice);
    TestBed.tick();
    expect(choice.theme()).toBe('system');
    expect(document.documentElement.dataset['theme']).toBeUndefined();
  });

  it('sets the page to the choice and keeps it', () => {
    const choice = TestBed.inject(ThemeChoice);
    choice.theme.set('dark');
    TestBed.tick();
    expect(document.documentElement.dataset['theme']).toBe('dark');
    expect(localStorage.getItem('ligament.theme')).toBe('dark');
    choice.theme.set('system');
    TestBed.tick();
    expect(document.documentElement.dataset['theme']).toBeUndefined();
  });

  it('takes up a kept choice, and ignores what is none', () => {
    localStorage.setItem('ligament.theme', 'light');
    expect(TestBed.inject(ThemeChoice).theme()).toBe('light');
    TestBed.resetTestingModule();
    localStorage.setItem('ligament.theme', 'purple');
    expect(TestBed.inject(ThemeChoice).theme()).toBe('system');
  });
});
