import { type ComponentFixture, TestBed } from '@angular/core/testing';
import { FileDrop } from './file-drop';

const file = new File(['tag,depth\n'], 'R-401.csv', { type: 'text/csv' });

describe('FileDrop', () => {
  let fixture: ComponentFixture<FileDrop>;
  let page: HTMLElement;
  let picked: File[];

  beforeEach(async () => {
    fixture = TestBed.createComponent(FileDrop);
    fixture.componentRef.setInput('accept', '.csv');
    page = fixture.nativeElement as HTMLElement;
    picked = [];
    fixture.componentInstance.picked.subscribe((each) => picked.push(each));
    await fixture.whenStable();
  });

  function drag(type: string, files: readonly File[] = []): Event {
    const event = Object.assign(new Event(type, { cancelable: true }), { dataTransfer: { files } });
    page.querySelector('.drop')?.dispatchEvent(event);
    return event;
  }

  it('takes a dropped file instead of opening it in the browser', async () => {
    expect(drag('dragover').defaultPrevented).toBe(true);
    await fixture.whenStable();
    expect(page.querySelector('.over')).not.toBeNull();
    expect(drag('drop', [file]).defaultPrevented).toBe(true);
    await fixture.whenStable();
    expect(picked).toEqual([file]);
    expect(page.querySelector('.over')).toBeNull();
  });

  it('takes a chosen file, also by keyboard through the button', () => {
    const field = page.querySelector('input');
    if (!field) throw new Error('no file field');
    let opened = 0;
    field.click = () => opened++;
    page.querySelector('button')?.click();
    expect(opened).toBe(1);
    Object.defineProperty(field, 'files', { value: [file] });
    field.dispatchEvent(new Event('change'));
    expect(picked).toEqual([file]);
    expect(field.accept).toBe('.csv');
  });

  it('takes nothing from an empty drop', () => {
    drag('drop');
    expect(picked).toEqual([]);
  });
});
