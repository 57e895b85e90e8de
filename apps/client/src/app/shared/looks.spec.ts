import type { Type } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { provideRouter } from '@angular/router';
import { VERDICTS } from '@ligament/domain/assessment/assessment-outcome';
import { Caution } from './caution/caution';
import { Chip } from './chips/chip';
import { FigureStrip } from './figure-strip/figure-strip';
import { PageHeader } from './page-header/page-header';
import { ProblemNotice } from './problem/problem-notice';
import { ProvenanceMark } from './provenance/provenance-mark';
import { EmptyState } from './states/empty-state';
import { FailedState } from './states/failed-state';
import { LoadingState } from './states/loading-state';

async function show<T>(part: Type<T>, inputs: Readonly<Record<string, unknown>>) {
  TestBed.configureTestingModule({ providers: [provideRouter([])] });
  const fixture = TestBed.createComponent(part);
  Object.entries(inputs).forEach(([name, value]) => fixture.componentRef.setInput(name, value));
  await fixture.whenStable();
  const page = fixture.nativeElement as HTMLElement;
  return {
    page,
    part: fixture.componentInstance,
    text: page.textContent?.replace(/\s+/g, ' ').trim(),
  };
}

const PROBLEM = {
  title: 'No connection',
  detail: 'The server cannot be reached.',
  errors: [
    { field: 'depthMm', message: 'Must be above 0 mm.' },
    { field: 'lengthMm', message: 'Must be above 0 mm.' },
  ],
};

describe('a chip', () => {
  it('gives every verdict its own shape, so that colour never stands alone', async () => {
    const words = [...VERDICTS, 'cannot tell'];
    const shapes = new Set<string | undefined>();
    for (const word of words) {
      const { page, text } = await show(Chip, { word });
      expect(text).toContain(word);
      shapes.add(page.querySelector('[aria-hidden]')?.textContent ?? undefined);
      TestBed.resetTestingModule();
    }
    expect(shapes.size).toBe(words.length);
  });

  it('shows other words with the tone of its word', async () => {
    const { page, text } = await show(Chip, { word: 'acceptable', label: 'Acceptable, monitor' });
    expect(text).toBe('● Acceptable, monitor');
    expect(page.classList).toContain('good');
  });

  it('is plain for a word it does not know', async () => {
    const { page } = await show(Chip, { word: 'something else' });
    expect(page.classList).toContain('plain');
  });
});

describe('a figure strip', () => {
  it('shows each figure with its uncertainty and unit', async () => {
    const { page, text } = await show(FigureStrip, {
      figures: [
        { label: 'Depth a', value: '4.6', unit: 'mm', beside: '± 1.0' },
        { label: 'Remaining life', value: '5.7', unit: 'years', tone: 'warn' },
      ],
    });
    expect(text).toContain('Depth a4.6 ± 1.0 mm');
    expect(page.querySelectorAll('dt')).toHaveLength(2);
    expect(page.querySelectorAll('dd')[1]?.className).toBe('warn');
  });
});

describe('a page header', () => {
  it('says where the reader is', async () => {
    const { page, text } = await show(PageHeader, {
      title: 'R-401-F01',
      crumbs: [{ label: 'Unit U400', link: '/register' }, { label: 'R-401 batch reactor' }],
    });
    expect(page.querySelector('h1')?.textContent).toBe('R-401-F01');
    expect(text).toContain('Unit U400 / R-401 batch reactor');
    expect(page.querySelector('a')?.getAttribute('href')).toBe('/register');
  });

  it('has no empty trail', async () => {
    const { page } = await show(PageHeader, { title: 'Flaws' });
    expect(page.querySelector('nav')).toBeNull();
  });
});

describe('a problem', () => {
  it('is announced, with every field at fault', async () => {
    const { page, text } = await show(ProblemNotice, { problem: PROBLEM });
    expect(page.querySelector('[role=alert]')).not.toBeNull();
    expect(text).toContain('No connection. The server cannot be reached.');
    expect(page.querySelectorAll('li')).toHaveLength(2);
  });

  it('takes no room where there is none', async () => {
    expect((await show(ProblemNotice, { problem: null })).text).toBe('');
  });

  it('that kept a page from loading can be tried again', async () => {
    const { page, part } = await show(FailedState, { problem: PROBLEM });
    let tries = 0;
    part.again.subscribe(() => tries++);
    page.querySelector('button')?.click();
    expect(tries).toBe(1);
  });
});

describe('the other states', () => {
  it('say what is loading', async () => {
    const { page } = await show(LoadingState, { what: 'flaws' });
    expect(page.querySelector('[role=status]')?.textContent).toBe('Loading flaws …');
  });

  it('say why there is nothing', async () => {
    const { text } = await show(EmptyState, { title: 'No inspection yet', hint: 'Upload a file.' });
    expect(text).toBe('No inspection yetUpload a file.');
  });
});

describe('where a value comes from', () => {
  it('stands out when it is only assumed', async () => {
    const { page } = await show(ProvenanceMark, { provenance: 'assumed', note: 'no certificate' });
    expect(page.querySelector('.assumed')?.getAttribute('title')).toBe('no certificate');
    TestBed.resetTestingModule();
    const other = await show(ProvenanceMark, { provenance: 'certificate' });
    expect(other.page.querySelector('.assumed')).toBeNull();
  });

  it('is listed beside every verdict', async () => {
    const { text } = await show(Caution, { assumed: ['toughness', 'residual stress'] });
    expect(text).toContain('Assumed, not known: toughness, residual stress.');
    TestBed.resetTestingModule();
    const other = await show(Caution, {});
    expect(other.text).not.toContain('Assumed');
    expect(other.text).toContain('competent person');
  });
});
