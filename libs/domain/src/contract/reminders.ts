import * as z from 'zod';
import { id, instant, isoDate, listQuery, page } from './primitives';
import { route } from './route';
import { MAIL_STATES, REMINDER_STATES } from './vocabulary';

export const reminderRow = z.object({
  id,
  reinspectionId: id,
  tag: z.string(),
  task: z.string(),
  dueOn: isoDate,
  leadDays: z.number().int().describe('Days before the due date; negative when overdue'),
  recipientName: z.string(),
  recipientEmail: z.string(),
  state: z.enum(REMINDER_STATES),
  createdAt: instant,
  sentAt: instant.nullable(),
  acknowledgedAt: instant.nullable(),
  lastError: z.string(),
});
export type ReminderRow = z.infer<typeof reminderRow>;

export const listReminders = route({
  method: 'get',
  path: '/api/reminders',
  summary: 'Reminders, newest first',
  access: 'reminders.read',
  query: z.object({
    ...listQuery,
    state: z.enum(REMINDER_STATES).optional(),
    reinspection: id.optional(),
  }),
  response: page(reminderRow),
});

export const acknowledgeReminder = route({
  method: 'post',
  path: '/api/reminders/:id/acknowledge',
  summary: 'Say that a reminder was seen; planning is another step',
  access: 'reminders.acknowledge',
  params: z.object({ id }),
});

export const runReminders = route({
  method: 'post',
  path: '/api/reminders/run',
  summary: 'Look for reminders that are due and send what waits, now',
  access: 'reminders.run',
  status: 200,
  response: z.object({
    queued: z.number().int(),
    sent: z.number().int(),
    failed: z.number().int(),
  }),
});

export const readHeartbeat = route({
  method: 'get',
  path: '/api/reminders/heartbeat',
  summary: 'When reminders were last looked for, and what could not be delivered',
  access: 'reminders.read',
  response: z.object({ lastRunAt: instant.nullable(), undelivered: z.number().int() }),
});

export const mailRow = z.object({
  id,
  recipients: z.string(),
  subject: z.string(),
  receivedAt: instant,
});
export const mailView = mailRow.extend({
  sender: z.string(),
  messageId: z.string(),
  text: z.string(),
});
export type MailRow = z.infer<typeof mailRow>;
export type MailView = z.infer<typeof mailView>;

export const listMails = route({
  method: 'get',
  path: '/api/mails',
  summary:
    'Mail received by the built-in mailbox, newest first; one-time links only for administrators',
  access: 'mail.read',
  query: z.object(listQuery),
  response: page(mailRow),
});

export const readMail = route({
  method: 'get',
  path: '/api/mails/:id',
  summary: 'One mail of the built-in mailbox',
  access: 'mail.read',
  params: z.object({ id }),
  response: mailView,
});

export const listUndelivered = route({
  method: 'get',
  path: '/api/undelivered-mails',
  summary: 'Mail that could not be delivered',
  access: 'mail.read',
  response: z.object({
    rows: z.array(
      z.object({
        id,
        recipient: z.string(),
        subject: z.string(),
        state: z.enum(MAIL_STATES),
        attempts: z.number().int(),
        lastError: z.string(),
        createdAt: instant,
      }),
    ),
  }),
});
