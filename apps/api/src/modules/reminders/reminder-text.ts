/** What a reminder tells of a re-inspection. */
export interface ReminderSubject {
  readonly tag: string;
  readonly componentDescription: string;
  readonly locationName: string | null;
  readonly flawNumber: string | null;
  readonly task: string;
  readonly technique: string;
  readonly dueOn: string;
  readonly latestFinishOn: string;
  readonly daysLeft: number;
  readonly basis: string;
  readonly standing: string;
  readonly siteName: string;
  readonly link: string;
}

export interface ReminderLetter {
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/** Words of a reminder: the first screen says what, by when, why, what is planned and what happens if it is missed. */
export function reminderLetter(about: ReminderSubject): ReminderLetter {
  const place = [about.tag, about.locationName].filter(Boolean).join(' ');
  const what = about.flawNumber ? `flaw ${about.flawNumber}, accepted until then` : about.task;
  const subject = `[Due ${about.dueOn}] ${place} – ${what} – ${about.standing}`;
  const left =
    about.daysLeft < 0 ? `OVERDUE by ${-about.daysLeft} days` : `${about.daysLeft} days left`;
  const rows: readonly (readonly [string, string])[] = [
    ['Component', `${about.tag} ${about.componentDescription}`],
    ['Place', about.locationName ?? 'the component'],
    ['Work', about.task],
    ['Technique', about.technique],
    ['Due date', `${about.dueOn} (${left})`],
    [
      'Latest finish',
      `${about.latestFinishOn}, so that report and assessment are done by the due date`,
    ],
    ['Basis', about.basis],
    ['Plan', about.standing],
    [
      'If missed',
      about.flawNumber ? `acceptance of flaw ${about.flawNumber} ends` : 'the component is overdue',
    ],
  ];
  const closing = [
    `Open the record before you act on this mail: ${about.link}`,
    'The date supports the judgement of a competent person; the code and regulations in force at the site and the owner’s procedures decide.',
    `Ligament, ${about.siteName}`,
  ];
  return {
    subject,
    text: [...rows.map(([name, value]) => `${name}: ${value}`), '', ...closing].join('\n'),
    html: `<table>${rows.map(([name, value]) => `<tr><th align="left">${escape(name)}</th><td>${escape(value)}</td></tr>`).join('')}</table>${closing.map((line) => `<p>${escape(line)}</p>`).join('')}`,
  };
}

const ESCAPES: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};
const escape = (text: string): string =>
  text.replaceAll(/[&<>"']/g, (each) => ESCAPES[each] ?? each);
