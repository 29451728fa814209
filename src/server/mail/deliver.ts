import nodemailer, { type Transporter } from 'nodemailer';
import { ok, type Result } from '../../domain/result.ts';

/** One message to one reader. Subject and file name never hold patient data. */
export interface Mail {
  messageId: string;
  from: string;
  to: string;
  subject: string;
  text: string;
  attachment: { filename: string; content: Uint8Array };
}

/** `transient`: worth trying again by itself. `permanent`: somebody has to change something first. */
export interface MailFailure {
  kind: 'transient' | 'permanent';
  message: string;
}

const DOCX = 'application/vnd.openxmlformats-officedocument.wordprocessingml.document';

const patience = 'connectionTimeout=10000&greetingTimeout=10000&socketTimeout=20000';

export const openTransport = (smtpUrl: string): Transporter =>
  nodemailer.createTransport(`${smtpUrl}${smtpUrl.includes('?') ? '&' : '?'}${patience}`);

const field = (error: unknown, name: string): unknown =>
  typeof error === 'object' && error !== null && name in error ? Reflect.get(error, name) : undefined;

/**
 * Sorts what the mail server said: 5xx answers to the address or the message are permanent (RFC 5321 section 4.2.1),
 * all else, an unreachable server included, is transient. The server's own words are not passed on: they can quote the message.
 */
export const sortFailure = (error: unknown): MailFailure => {
  const status = field(error, 'responseCode');
  if (typeof status === 'number' && status >= 500) {
    return {
      kind: 'permanent',
      message: `The mail server refused the letter (${status}). Check the address.`,
    };
  }
  if (typeof status === 'number') {
    return { kind: 'transient', message: `The mail server asked to try again later (${status}).` };
  }
  return { kind: 'transient', message: 'The mail server could not be reached.' };
};

export const deliver = async (transport: Transporter, mail: Mail): Promise<Result<null, MailFailure>> => {
  try {
    await transport.sendMail({
      messageId: mail.messageId,
      from: mail.from,
      to: mail.to,
      subject: mail.subject,
      text: mail.text,
      attachments: [
        {
          filename: mail.attachment.filename,
          content: Buffer.from(mail.attachment.content),
          contentType: DOCX,
        },
      ],
    });
    return ok(null);
  } catch (error) {
    return { ok: false, error: sortFailure(error) };
  }
};
