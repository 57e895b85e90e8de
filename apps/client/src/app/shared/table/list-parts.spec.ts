import { ChangeDetectionStrategy, Component, inject } from '@angular/core';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { ActivatedRoute, provideRouter, Router } from '@angular/router';
import { RouterTestingHarness } from '@angular/router/testing';
import { ListQuery } from './list-query';
import { Pager } from './pager';
import { SortHeader } from './sort-header';

@Component({ selector: 'app-page', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {
  readonly route = inject(ActivatedRoute);
}

describe('ListQuery', () => {
  async function after(change: Record<string, string | null>): Promise<string> {
    TestBed.configureTestingModule({
      providers: [provideRouter([{ path: 'flaws', component: Page }])],
    });
    const harness = await RouterTestingHarness.create();
    const page = await harness.navigateByUrl('/flaws?state=open&cursor=abc', Page);
    TestBed.inject(ListQuery).set(page.route, change);
    await harness.fixture.whenStable();
    return TestBed.inject(Router).url;
  }

  it('keeps the other filters and starts at the first page', async () => {
    expect(await after({ search: 'R-401' })).toBe('/flaws?state=open&search=R-401');
  });

  it('takes out what is empty', async () => {
    expect(await after({ state: '' })).toBe('/flaws');
  });

  it('goes to a page when asked for one', async () => {
    expect(await after({ cursor: 'def' })).toBe('/flaws?state=open&cursor=def');
  });
});

@Component({
  selector: 'app-list',
  imports: [SortHeader, Pager],
  template: `<table>
      <tr>
        <th app-sort by="tag" [current]="sort" (sorted)="asked.push($event)">Component</th>
      </tr>
    </table>
    <app-pager [cursor]="cursor" [nextCursor]="next" (go)="asked.push($event)" />`,
  changeDetection: ChangeDetectionStrategy.OnPush,
})
class List {
  sort: string | undefined;
  cursor: string | null = null;
  next: string | null = null;
  readonly asked: (string | null)[] = [];
}

describe('the parts of a list', () => {
  let fixture: ComponentFixture<List>;
  let list: List;
  let page: HTMLElement;

  async function show(state: Partial<List>): Promise<void> {
    fixture = TestBed.createComponent(List);
    list = Object.assign(fixture.componentInstance, state);
    page = fixture.nativeElement as HTMLElement;
    await fixture.whenStable();
  }

  const press = () => page.querySelectorAll('button').forEach((button) => button.click());

  it.each([
    [undefined, 'none', 'tag'],
    ['tag', 'ascending', '-tag'],
    ['-tag', 'descending', 'tag'],
    ['dueOn', 'none', 'tag'],
  ])('sorted by %p, a heading says %p and asks for %p', async (sort, said, asked) => {
    await show({ sort });
    press();
    expect(page.querySelector('th')?.getAttribute('aria-sort')).toBe(said);
    expect(list.asked).toEqual([asked]);
  });

  it('offers the next page and the way back to the first', async () => {
    await show({ cursor: 'abc', next: 'def' });
    page
      .querySelector('app-pager')
      ?.querySelectorAll('button')
      .forEach((button) => button.click());
    expect(list.asked).toEqual([null, 'def']);
  });

  it('offers nothing where there is one page only', async () => {
    await show({});
    expect(page.querySelectorAll('app-pager button')).toHaveLength(0);
  });
});
