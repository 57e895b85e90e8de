import { jest } from '@jest/globals';
import { provideHttpClient } from '@angular/common/http';
import { HttpTestingController, provideHttpClientTesting } from '@angular/common/http/testing';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { MatAutocompleteHarness } from '@angular/material/autocomplete/testing';
import { provideRouter, Router } from '@angular/router';
import { SearchBox } from './search-box';

const HIT = {
  kind: 'flaw',
  id: '1',
  title: 'R-401-F01',
  subtitle: 'longitudinal seam L1',
  link: '/flaws/1',
};

describe('SearchBox', () => {
  let fixture: ComponentFixture<SearchBox>;
  let server: HttpTestingController;
  let box: MatAutocompleteHarness;
  const pause = () => new Promise((resolve) => setTimeout(resolve, 200));

  beforeEach(async () => {
    TestBed.configureTestingModule({
      providers: [provideHttpClient(), provideHttpClientTesting(), provideRouter([])],
    });
    fixture = TestBed.createComponent(SearchBox);
    server = TestBed.inject(HttpTestingController);
    box = await TestbedHarnessEnvironment.loader(fixture).getHarness(MatAutocompleteHarness);
  });

  async function find(words: string, items: readonly unknown[]): Promise<void> {
    await box.enterText(words);
    await pause();
    server.expectOne(`/api/search?q=${words}`).flush({ items });
    await fixture.whenStable();
  }

  it('asks once the typing rests, and goes to what is chosen', async () => {
    const navigate = jest
      .spyOn(TestBed.inject(Router), 'navigateByUrl')
      .mockImplementation(() => Promise.resolve(true));
    await find('R-401', [HIT]);
    const [option] = await box.getOptions();
    expect(await option?.getText()).toContain('R-401-F01 flaw · longitudinal seam L1');
    await option?.click();
    expect(navigate).toHaveBeenCalledWith('/flaws/1');
    expect(await box.getValue()).toBe('');
  });

  it('says so when nothing is found', async () => {
    await find('V-999', []);
    const [option] = await box.getOptions();
    expect(await option?.getText()).toBe('Nothing found for “V-999”');
    expect(await option?.isDisabled()).toBe(true);
  });

  it('asks nothing for a single letter', async () => {
    await box.enterText('R');
    await pause();
    server.expectNone(() => true);
    expect(await box.isOpen()).toBe(false);
  });

  it('takes the cursor by the slash key, but not from another field', async () => {
    const host = fixture.nativeElement as HTMLElement;
    const other = document.createElement('input');
    document.body.append(host, other);
    other.dispatchEvent(new KeyboardEvent('keydown', { key: '/', bubbles: true }));
    expect(await box.isFocused()).toBe(false);
    document.body.dispatchEvent(new KeyboardEvent('keydown', { key: '/', bubbles: true }));
    expect(await box.isFocused()).toBe(true);
    other.remove();
  });
});
