import { assessFlaw } from '@ligament/domain/assessment/assess-flaw';
import { sampleInput } from '@ligament/domain/assessment/testing/sample-input';
import { DEFAULT_SITE_RULES } from '@ligament/domain/contract/site-rules';
import { setAt } from './edit-input';
import { assessLive, type LiveSubject } from './live-assessment';
import { type Unfinished, whatIsMissing } from './what-is-missing';

const subject = (over: Partial<LiveSubject> = {}): LiveSubject => ({
  input: sampleInput(),
  inspectedOn: '2026-11-10',
  mechanism: 'fatigue',
  rules: DEFAULT_SITE_RULES,
  ...over,
});

describe('assessLive', () => {
  it('gives what the engine gives, and the date by the site’s rules', () => {
    const { outcome, proposal, messages } = assessLive(subject());
    expect(outcome).toEqual(assessFlaw(sampleInput()));
    expect(messages.size).toBe(0);
    expect(proposal).toMatchObject({ status: 'proposed', dueOn: expect.any(String) });
  });

  it('computes nothing while a value is missing, and says where', () => {
    const input = setAt(sampleInput(), 'flaw.heightMm.value', Number.NaN);
    const live = assessLive(subject({ input }));
    expect(live.outcome).toBeNull();
    expect(live.proposal).toBeNull();
    expect(live.messages.get('flaw.heightMm')).toBe('Give a number in mm.');
  });

  it('finds a wrong number in a block of cycles', () => {
    const input = setAt(sampleInput(), 'growth.fatigue.blocks.0.cyclesPerYear', -1);
    expect([...assessLive(subject({ input })).messages.keys()]).toEqual([
      'growth.fatigue.blocks.0.cyclesPerYear',
    ]);
  });

  it('puts the engine’s limit beside the input that breaks it, and proposes no date', () => {
    const live = assessLive(subject({ input: sampleInput({ height: 24.5, length: 60 }) }));
    expect(live.outcome?.status).toBe('refused');
    expect(live.proposal).toBeNull();
    expect([...live.messages.values()].join(' ')).toMatch(/limit/);
  });

  it('proposes no date for a flaw that is not acceptable', () => {
    const live = assessLive(subject({ input: sampleInput({ height: 18, membrane: 260 }) }));
    expect(live.proposal).toMatchObject({ status: 'no date' });
  });

  it('waits with the date until the rules are here', () => {
    expect(assessLive(subject({ rules: null })).proposal).toBeNull();
  });
});

describe('whatIsMissing', () => {
  const ready = (over: Partial<Unfinished> = {}): Unfinished => {
    const { input, outcome, proposal } = assessLive(subject());
    return {
      input,
      outcome,
      proposal,
      register: input,
      conclusion: 'Acceptable.',
      chosenDueOn: '',
      chosenReason: '',
      ...over,
    };
  };

  it('is nothing when inputs, conclusion and date are right', () => {
    expect(whatIsMissing(ready())).toEqual([]);
  });

  it.each([
    ['a conclusion', { conclusion: ' ' }, /^Write the conclusion/],
    ['a result', { outcome: null }, /^Fill in the inputs/],
    ['a reason for a later date', { chosenDueOn: '2029-01-01' }, /needs a reason/],
    [
      'a date before the predicted limit',
      { chosenDueOn: '2300-01-01', chosenReason: 'no window' },
      /predicted to reach its limit/,
    ],
  ] as const)('asks for %s', (_what, over, words) => {
    const found = ready(over);
    const limited =
      found.proposal?.status === 'proposed'
        ? { ...found, proposal: { ...found.proposal, limitOn: '2040-01-01' } }
        : found;
    expect(whatIsMissing(limited)).toEqual([expect.stringMatching(words)]);
  });

  it('asks why a value was put over the register’s', () => {
    const input = setAt(sampleInput(), 'material.yieldMPa.value', 300);
    expect(whatIsMissing(ready({ input, register: sampleInput() }))).toEqual([
      'Say in the note why these differ from the register: yield strength.',
    ]);
  });
});
