import { TestBed } from '@angular/core/testing';
import type { Given } from '@ligament/domain/units/provenance';
import { of } from 'rxjs';
import { AskToughness } from '../../shared/toughness/ask-toughness';
import type { KnownOfToughness } from '../../shared/toughness/evidence';
import { ToughnessButton } from './toughness-button';

describe('ToughnessButton', () => {
  it('asks with what is known and hands on the value that is taken', async () => {
    const asked: KnownOfToughness[] = [];
    const given: Given = { value: 75.8, provenance: 'measured', note: 'Critical J at -20 °C' };
    const ask = (known: KnownOfToughness) => {
      asked.push(known);
      return of({ given, temperatureC: -20 });
    };
    TestBed.configureTestingModule({ providers: [{ provide: AskToughness, useValue: { ask } }] });
    const fixture = TestBed.createComponent(ToughnessButton);
    const known = { numbers: { thicknessMm: { ...given, value: 25 } } };
    fixture.componentRef.setInput('known', known);
    const taken: Given[] = [];
    fixture.componentInstance.found.subscribe((each) => taken.push(each));
    await fixture.whenStable();
    const button = (fixture.nativeElement as HTMLElement).querySelector('button');
    expect(button?.textContent).toContain('By its source…');
    button?.click();
    expect(asked).toEqual([known]);
    expect(taken).toEqual([given]);
  });
});
