import { jest } from '@jest/globals';
import { TestbedHarnessEnvironment } from '@angular/cdk/testing/testbed';
import { ChangeDetectionStrategy, Component } from '@angular/core';
import { TestBed } from '@angular/core/testing';
import { MATERIAL_ANIMATIONS } from '@angular/material/core';
import { MatDialog } from '@angular/material/dialog';
import { MatDialogHarness } from '@angular/material/dialog/testing';
import { firstValueFrom } from 'rxjs';
import { Ask } from './ask';

@Component({ selector: 'app-page', template: '', changeDetection: ChangeDetectionStrategy.OnPush })
class Page {}

/** A dialog answers when it has gone. */
const settled = () => firstValueFrom(TestBed.inject(MatDialog).afterAllClosed);

describe('Ask', () => {
  beforeEach(() => {
    // without a layout no field can be told to be focusable
    jest.spyOn(console, 'warn').mockImplementation(() => undefined);
    TestBed.configureTestingModule({
      providers: [{ provide: MATERIAL_ANIMATIONS, useValue: { animationsDisabled: true } }],
    });
  });

  afterEach(() => jest.restoreAllMocks());

  async function openDialog(open: (ask: Ask) => void) {
    const fixture = TestBed.createComponent(Page);
    open(TestBed.inject(Ask));
    await fixture.whenStable();
    const dialog =
      await TestbedHarnessEnvironment.documentRootLoader(fixture).getHarness(MatDialogHarness);
    const overlay = document.querySelector('.cdk-overlay-container');
    const press = async (label: string) => {
      [...(overlay?.querySelectorAll('button') ?? [])]
        .find((each) => each.textContent?.trim() === label)
        ?.click();
      await fixture.whenStable();
    };
    const type = (selector: string, text: string) => {
      const field = overlay?.querySelector<HTMLInputElement>(selector);
      if (!field) throw new Error(`no field ${selector}`);
      field.value = text;
      field.dispatchEvent(new Event('input'));
    };
    return { dialog, press, type };
  }

  const QUESTION = { title: 'End this session?', text: 'They sign in again.', action: 'End it' };
  const REASON = {
    title: 'Return to the author',
    text: 'The author reads this.',
    label: 'Reason',
    action: 'Return it',
  };

  it('confirms only when answered with yes', async () => {
    const answers: boolean[] = [];
    const { dialog, press } = await openDialog((ask) =>
      ask.confirm(QUESTION).subscribe((answer) => answers.push(answer)),
    );
    expect(await dialog.getTitleText()).toBe('End this session?');
    await press('End it');
    await settled();
    expect(answers).toEqual([true]);
  });

  it('says nothing when cancelled', async () => {
    const answers: boolean[] = [];
    const { dialog } = await openDialog((ask) =>
      ask.confirm(QUESTION).subscribe((answer) => answers.push(answer)),
    );
    await dialog.close();
    expect(answers).toEqual([]);
  });

  it('takes no decision without a reason', async () => {
    const answers: unknown[] = [];
    const { dialog, press, type } = await openDialog((ask) =>
      ask.reason(REASON).subscribe((answer) => answers.push(answer)),
    );
    await press('Return it');
    expect(answers).toEqual([]);
    expect(await dialog.getContentText()).toContain('Give a reason in words.');
    type('textarea', '  The toughness is not of this plate.  ');
    await press('Return it');
    await settled();
    expect(answers).toEqual([{ reason: 'The toughness is not of this plate.', password: '' }]);
  });

  it('asks for the password again before a signature', async () => {
    const answers: unknown[] = [];
    const { dialog, press, type } = await openDialog((ask) =>
      ask
        .reason({ ...REASON, optional: true, password: true })
        .subscribe((answer) => answers.push(answer)),
    );
    await press('Return it');
    expect(await dialog.getContentText()).toContain('Give your password.');
    type('input[type=password]', 'the tide comes in at seven');
    await press('Return it');
    await settled();
    expect(answers).toEqual([{ reason: '', password: 'the tide comes in at seven' }]);
  });
});
