import { assess } from './testing/assess';
import { given } from './testing/sample-input';

const text = (...args: Parameters<typeof assess>) => assess(...args).cautions.join('\n');

describe('cautions', () => {
  it('always end with whose judgement decides', () => {
    const { cautions } = assess();
    expect(cautions[cautions.length - 1]).toMatch(/competent person.*procedures decide/);
  });

  it('compare the size demanded for elastic use with the ligament too', () => {
    const deep = text({ height: 17, length: 60, membrane: 90, toughness: 300 });
    expect(deep).toMatch(/above (a|the ligament)/);
  });

  it('tell that secondary stress is large against primary', () => {
    const residual = { state: 'entered', membraneMPa: given(300), bendingMPa: given(0) } as const;
    expect(text({ membrane: 20, residual })).not.toMatch(/χ above 4/);
    expect(text({ membrane: 300, bending: -280, residual, toughness: 300 })).toMatch(/χ above 4/);
  });

  it('name the limits of the solution that are close', () => {
    expect(text({ height: 18, length: 60, membrane: 60, toughness: 300 })).toMatch(
      /Close to a limit.*a\/t/,
    );
  });

  it('count the inputs that rest on an assumption', () => {
    expect(text()).not.toMatch(/assumption/);
  });

  it('tell that stress corrosion does not reach an embedded flaw', () => {
    expect(text({ kind: 'embedded', ligament: 10, stressCorrosion: 0.1 })).toMatch(
      /does not reach/,
    );
  });

  it('tell that an embedded flaw is assessed as a surface flaw', () => {
    expect(text({ kind: 'embedded', height: 6, ligament: 1.5 })).toMatch(/surface flaw 8 mm deep/);
  });
});
