import { outgoingMails } from '@ligament/domain/schema/schedule';
import type { Config } from '../../config';
import type { Database } from '../../db/database';
import { tokenHash } from './one-time-token';

interface Letter {
  readonly subject: string;
  readonly paragraphs: readonly string[];
  readonly link: string;
}

interface Addressee {
  readonly siteId: string;
  readonly name: string;
  readonly email: string;
  readonly siteName: string;
}

/** Queues an invitation in the transaction of whatever invites; the mail job sends it. */
export function queueInvitation(
  db: Database,
  config: Config,
  to: Addressee,
  by: string,
  token: string,
  now: Date,
): Promise<void> {
  return queue(db, 'invitation', to, token, now, {
    subject: `Invitation to Ligament for ${to.siteName}`,
    paragraphs: [
      `Dear ${to.name},`,
      `${by} invites you to Ligament, where ${to.siteName} keeps the flaws of its pressure equipment, their assessments and their re-inspection dates.`,
      'Open the link below within 72 hours and choose a password. It works once.',
    ],
    link: `${config.publicUrl}/accept/${token}`,
  });
}

/** Queues the mail with which a person chooses a new password. */
export function queuePasswordReset(
  db: Database,
  config: Config,
  to: Addressee,
  token: string,
  now: Date,
): Promise<void> {
  return queue(db, 'password reset', to, token, now, {
    subject: 'Choose a new password for Ligament',
    paragraphs: [
      `Dear ${to.name},`,
      'A new password was asked for at this address. Open the link below within 30 minutes and choose one; all your sessions end then. It works once.',
      'If you did not ask for it, do nothing: your password stays as it is.',
    ],
    link: `${config.publicUrl}/reset-password/${token}`,
  });
}

async function queue(
  db: Database,
  kind: 'invitation' | 'password reset',
  to: Addressee,
  token: string,
  now: Date,
  letter: Letter,
): Promise<void> {
  await db.insert(outgoingMails).values({
    siteId: to.siteId,
    // part of the token's hash: the same for a repeat of this mail, and telling nobody the token
    messageId: `<${kind.replaceAll(' ', '-')}.${tokenHash(token).slice(0, 24)}@ligament>`,
    kind,
    recipient: to.email,
    subject: letter.subject,
    text: [...letter.paragraphs, letter.link, '', 'Ligament'].join('\n\n'),
    html: html(letter),
    nextAttemptAt: now,
    createdAt: now,
  });
}

function html({ paragraphs, link }: Letter): string {
  const body = paragraphs.map((paragraph) => `<p>${escaped(paragraph)}</p>`).join('\n');
  return `${body}\n<p><a href="${escaped(link)}">${escaped(link)}</a></p>\n<p>Ligament</p>`;
}

const ENTITY: Readonly<Record<string, string>> = {
  '&': '&amp;',
  '<': '&lt;',
  '>': '&gt;',
  '"': '&quot;',
  "'": '&#39;',
};

const escaped = (text: string): string =>
  text.replaceAll(/[&<>"']/g, (mark) => ENTITY[mark] ?? mark);
