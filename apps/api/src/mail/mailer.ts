import nodemailer from 'nodemailer';

export interface MailToSend {
  readonly messageId: string;
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

/** Sends one mail; rejects with the server's answer when it cannot. */
export interface Mailer {
  send(mail: MailToSend): Promise<void>;
  close(): void;
}

const SECOND = 1000;

/** A mailer over SMTP; every header is built by the package from its own field, never from text with line breaks. */
export function smtpMailer(url: string, from: string): Mailer {
  const transport = nodemailer.createTransport({
    url,
    connectionTimeout: 10 * SECOND,
    greetingTimeout: 10 * SECOND,
    socketTimeout: 20 * SECOND,
    disableFileAccess: true,
    disableUrlAccess: true,
  });
  return {
    async send({ to, subject, ...mail }) {
      refuseLineBreaks(to);
      await transport.sendMail({
        ...mail,
        from: { name: 'Ligament', address: from },
        to: { name: '', address: to },
        subject: subject.replaceAll(/[\r\n]+/g, ' '),
      });
    },
    close: () => transport.close(),
  };
}

function refuseLineBreaks(address: string): void {
  if (/[\r\n,;]/.test(address))
    throw Object.assign(new Error('The address holds more than one line or recipient.'), {
      responseCode: 553,
    });
}
