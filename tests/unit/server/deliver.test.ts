import { SMTPServer } from 'smtp-server';
import { afterAll, beforeAll, describe, expect, it } from 'vitest';
import { deliver, type Mail, openTransport, sortFailure } from '../../../src/server/mail/deliver.ts';

const mail: Mail = {
  messageId: '<letter-1@example.org>',
  from: 'Larkfield Eye Unit <letters@example.org>',
  to: 'reader@example.org',
  subject: 'Letter from Larkfield Eye Unit',
  text: 'A letter is attached.',
  attachment: { filename: 'letter-4K7Q.docx', content: new Uint8Array([1, 2, 3]) },
};

describe('deliver', () => {
  const received: string[] = [];
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ['STARTTLS'],
    onRcptTo(address, _session, done) {
      if (address.address.startsWith('nobody@')) {
        done(Object.assign(new Error('5.1.1 no such person'), { responseCode: 550 }));
      } else if (address.address.startsWith('busy@')) {
        done(Object.assign(new Error('4.2.2 mailbox busy'), { responseCode: 451 }));
      } else done();
    },
    onData(stream, _session, done) {
      const parts: Buffer[] = [];
      stream.on('data', (part: Buffer) => parts.push(part));
      stream.on('end', () => {
        received.push(Buffer.concat(parts).toString('utf8'));
        done();
      });
    },
  });
  let url = '';

  beforeAll(async () => {
    await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
    const address = server.server.address();
    if (typeof address !== 'object' || address === null) throw new Error('no port');
    url = `smtp://127.0.0.1:${address.port}`;
  });
  afterAll(() => new Promise<void>((resolve) => server.close(resolve)));

  it('hands the letter over with its own Message-ID', async () => {
    expect(await deliver(openTransport(url), mail)).toEqual({ ok: true, value: null });
    expect(received[0]).toContain('Message-ID: <letter-1@example.org>');
    expect(received[0]).toContain('filename=letter-4K7Q.docx');
  });

  it('tells a refused address from a busy one, without the server’s words', async () => {
    const refused = await deliver(openTransport(url), { ...mail, to: 'nobody@example.org' });
    expect(refused).toEqual({
      ok: false,
      error: { kind: 'permanent', message: 'The mail server refused the letter (550). Check the address.' },
    });
    const busy = await deliver(openTransport(url), { ...mail, to: 'busy@example.org' });
    expect(busy).toMatchObject({ ok: false, error: { kind: 'transient' } });
  });

  it('takes a dead server for a transient failure', async () => {
    expect(await deliver(openTransport('smtp://127.0.0.1:9'), mail)).toMatchObject({
      ok: false,
      error: { kind: 'transient', message: 'The mail server could not be reached.' },
    });
    expect(sortFailure('anything')).toMatchObject({ kind: 'transient' });
  });
});
