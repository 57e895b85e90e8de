import { jest } from '@jest/globals';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MATERIAL_ANIMATIONS } from '@angular/material/core';
import type { Given } from '@ligament/domain/units/provenance';
import { AskToughness } from './ask-toughness';
import type { ToughnessAnswer } from './toughness-answer';

@Component({ selector: 'app-page', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

const given = (value: number): Given => ({ value, provenance: 'measured', note: '' });

describe('the dialog for a toughness by its source', () => {
  beforeEach(() => {
    // without a layout no field can be told to be focusable
    jest.spyOn(console, 'warn').mockImplementation(() => undefined);
    TestBed.configureTestingModule({
      providers: [{ provide: MATERIAL_ANIMATIONS, useValue: { animationsDisabled: true } }],
    });
  });

  afterEach(() => jest.restoreAllMocks());

  async function open() {
    const fixture = TestBed.createComponent(Page);
    const answers: ToughnessAnswer[] = [];
    const loadCases = [
      { name: 'Cold start', temperatureC: 0, stressFactor: 1 },
      { name: 'Operation', temperatureC: 60, stressFactor: 1 },
    ];
    TestBed.inject(AskToughness)
      .ask({ numbers: { thicknessMm: given(25) }, loadCases })
      .subscribe((answer) => answers.push(answer));
    await fixture.whenStable();
    const overlay = document.querySelector('.cdk-overlay-container') as HTMLElement;
    const type = async (id: string, text: string) => {
      const field = document.getElementById(id) as HTMLInputElement;
      field.value = text;
      field.dispatchEvent(new Event('input'));
      await fixture.whenStable();
    };
    const choose = async (select: HTMLSelectElement, value: string) => {
      select.value = value;
      select.dispatchEvent(new Event('change'));
      await fixture.whenStable();
    };
    const press = async (label: string) => {
      const buttons = [...overlay.querySelectorAll('button')];
      buttons.find((each) => each.textContent?.trim() === label)?.click();
      await fixture.whenStable();
    };
    return { overlay, answers, type, choose, press, text: () => overlay.textContent ?? '' };
  }

  it('asks for what is missing, then shows the value and hands it over', async () => {
    const { overlay, answers, type, choose, press, text } = await open();
    expect(text()).toContain(
      'Still needed: Governing temperature, Temperature of the test, Charpy energy',
    );
    expect(overlay.querySelector('[aria-invalid]')).toBeNull();
    await type('toughness-energyJ', '40');
    await type('toughness-testTemperatureC', '0');
    await press('Take its temperature');
    expect(text()).toContain('Kmat 75.9 MPa√m');
    expect(text()).toContain('BS 7910');
    const origins = overlay.querySelectorAll<HTMLSelectElement>('select[aria-label]');
    for (const each of origins) await choose(each, 'certificate');
    await press('Use this value');
    await new Promise((done) => setTimeout(done));
    expect(answers).toMatchObject([
      { given: { value: 75.8, provenance: 'certificate' }, temperatureC: 0 },
    ]);
  });

  it('says at the field what is wrong with it', async () => {
    const { type } = await open();
    await type('toughness-energyJ', '4000');
    const field = document.getElementById('toughness-energyJ');
    expect(field?.getAttribute('aria-invalid')).toBe('true');
    const message = document.getElementById(field?.getAttribute('aria-describedby') ?? '');
    expect(message?.textContent).toContain('at most 450 J');
  });

  it('changes its fields with the kind of evidence', async () => {
    const { overlay, choose, press } = await open();
    await choose(overlay.querySelector('select') as HTMLSelectElement, 'table');
    expect(document.getElementById('toughness-energyJ')).toBeNull();
    const rows = () => overlay.querySelectorAll('app-evidence-fields tbody tr').length;
    expect(rows()).toBe(2);
    await press('Add a row');
    expect(rows()).toBe(3);
  });
});
