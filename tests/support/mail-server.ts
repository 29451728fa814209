import { createServer, type Server } from 'node:net';

/** What happens to the next messages, in turn; `take` for all that come after. */
export type Fate = 'take' | 'busy' | 'refuse' | 'hang-up-after-data';

export interface MailServer {
  url: string;
  /** What was handed over, whether or not it was acknowledged. */
  received: () => string[];
  next: (...fates: Fate[]) => void;
  /** Stops and starts answering at the same address. */
  down: () => Promise<void>;
  up: () => Promise<void>;
}

/** A mail server that does as it is told, down to breaking off between the message and its acknowledgement. */
export const openMailServer = async (): Promise<MailServer> => {
  const received: string[] = [];
  const fates: Fate[] = [];
  let port = 0;
  let server: Server | undefined;

  const answer = () =>
    createServer((socket) => {
      socket.setEncoding('utf8').on('error', () => socket.destroy());
      const say = (line: string) => socket.write(`${line}\r\n`);
      let text = '';
      let inData = false;
      let fate: Fate = 'take';
      const endOfData = () => {
        received.push(text.slice(0, text.indexOf('\r\n.\r\n')));
        text = '';
        inData = false;
        // Slow enough that a second worker comes while the first is still waiting.
        if (fate === 'hang-up-after-data') socket.destroy();
        else setTimeout(() => say('250 taken'), 150);
      };
      const command = (line: string) => {
        const verb = line.slice(0, 4).toUpperCase();
        if (verb === 'RCPT') {
          fate = fates.shift() ?? 'take';
          say(fate === 'busy' ? '451 try later' : fate === 'refuse' ? '550 no such person' : '250 fine');
        } else if (verb === 'DATA') {
          inData = true;
          say('354 go on');
        } else if (verb === 'QUIT') socket.end('221 bye\r\n');
        else say('250 fine');
      };
      say('220 mail.example.org');
      socket.on('data', (part) => {
        text += String(part);
        for (;;) {
          if (inData) {
            if (!text.includes('\r\n.\r\n')) return;
            endOfData();
            return;
          }
          const end = text.indexOf('\r\n');
          if (end < 0) return;
          const line = text.slice(0, end);
          text = text.slice(end + 2);
          command(line);
        }
      });
    });

  const up = async (): Promise<void> => {
    const opened = answer();
    server = opened;
    await new Promise<void>((resolve) => opened.listen(port, '127.0.0.1', resolve));
    const address = opened.address();
    if (typeof address === 'object' && address !== null) port = address.port;
  };
  await up();

  return {
    url: `smtp://127.0.0.1:${port}`,
    received: () => [...received],
    next: (...coming) => fates.push(...coming),
    down: () =>
      new Promise((resolve) => {
        if (server === undefined) resolve();
        else server.close(() => resolve());
      }),
    up,
  };
};
