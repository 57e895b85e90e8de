import { ChangeDetectionStrategy, Component } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { Drawing } from './drawing';
import { cellText, headingOf, type TwinTable } from './twin-table';

@Component({
  selector: 'app-page',
  imports: [Drawing],
  template: `<app-drawing
    heading="Life line"
    caption="measured depth"
    [table]="table"
    name="R-401-F01"
  >
    <svg viewBox="0 0 10 10"><path d="M0 0 L5 5" /></svg>
  </app-drawing>`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class Page {
  readonly table: TwinTable = {
    columns: [{ label: 'Date' }, { label: 'Depth a', unit: 'mm', digits: 1 }],
    rows: [
      ['2026-11-10', 4.64],
      ['2029-09-13', null],
    ],
  };
}

describe('Drawing', () => {
  let fixture: ComponentFixture<Page>;
  let page: HTMLElement;
  let saved: { name: string; blob: Blob }[];

  beforeEach(async () => {
    saved = [];
    const blobs: Blob[] = [];
    URL.createObjectURL = (blob) => `blob:${blobs.push(blob as Blob)}`;
    URL.revokeObjectURL = () => undefined;
    HTMLAnchorElement.prototype.click = function (this: HTMLAnchorElement) {
      const blob = blobs.at(-1);
      if (blob) saved.push({ name: this.download, blob });
    };
    fixture = TestBed.createComponent(Page);
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  });

  async function press(label: string): Promise<void> {
    [...page.querySelectorAll('button')]
      .find((each) => each.textContent?.trim().startsWith(label))
      ?.click();
    await fixture.whenStable();
  }

  it('names the figure by its heading', () => {
    const figure = page.querySelector('figure');
    const heading = page.querySelector('h2');
    expect(heading?.textContent).toBe('Life line');
    expect(figure?.getAttribute('aria-labelledby')).toBe(heading?.id);
  });

  it('shows the same numbers as a table, with units', async () => {
    expect(page.querySelector('table')).toBeNull();
    await press('As table');
    const texts = (selector: string) =>
      [...page.querySelectorAll(selector)].map((each) => each.textContent?.trim());
    expect(texts('th')).toEqual(['Date', 'Depth a [mm]']);
    expect(texts('td')).toEqual(['2026-11-10', '4.6', '2029-09-13', '—']);
    expect(page.querySelector<HTMLElement>('.drawn')?.hidden).toBe(true);
    await press('As table');
    expect(page.querySelector('table')).toBeNull();
  });

  it('saves every digit as CSV', async () => {
    await press('CSV');
    expect(saved[0]?.name).toBe('R-401-F01.csv');
    expect(saved[0]?.blob.type).toBe('text/csv;charset=utf-8');
    const reader = new FileReader();
    const text = new Promise<string>((resolve) => {
      reader.onload = () => resolve(String(reader.result));
    });
    reader.readAsText(saved[0]?.blob ?? new Blob());
    expect(await text).toContain('2026-11-10,4.64');
  });

  it('saves the drawing as an SVG of its own', async () => {
    await press('SVG');
    expect(saved[0]).toMatchObject({ name: 'R-401-F01.svg', blob: { type: 'image/svg+xml' } });
  });
});

describe('a twin table', () => {
  it('writes units into headings and dashes where there is no number', () => {
    expect(headingOf({ label: 'Depth a', unit: 'mm' })).toBe('Depth a [mm]');
    expect(headingOf({ label: 'State' })).toBe('State');
    expect([cellText(undefined), cellText(''), cellText(Infinity)]).toEqual(['—', '—', '—']);
    expect(cellText(1234.5, 1)).toBe('1\u202f234.5');
  });
});
