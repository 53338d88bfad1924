import { once } from 'node:events';
import { type AddressInfo, createServer, type Server, type Socket } from 'node:net';

const END_OF_MESSAGE = '\r\n.\r\n';

/** A mail server of a few commands, which keeps the messages and answers each as `answer` says. */
export class MailServer {
  readonly messages: string[] = [];
  port = 0;
  /** What is answered when a whole message has come; null = nothing ever. */
  answer: () => string | null = () => '250 kept';
  private readonly sockets = new Set<Socket>();
  private readonly server: Server = createServer((socket) => this.talk(socket));

  async start(): Promise<void> {
    this.server.listen(0, '127.0.0.1');
    await once(this.server, 'listening');
    this.port = (this.server.address() as AddressInfo).port;
  }

  async stop(): Promise<void> {
    for (const socket of this.sockets) socket.destroy();
    await new Promise((resolve) => this.server.close(resolve));
  }

  /** The values of a header in the messages that came, folded lines joined. */
  headers(name: string): (string | undefined)[] {
    const pattern = new RegExp(`^${name}: (.*)$`, 'im');
    return this.messages.map((message) => pattern.exec(message.replace(/\r\n[ \t]+/g, ' '))?.[1].trim());
  }

  private talk(socket: Socket): void {
    this.sockets.add(socket);
    socket.on('error', () => undefined).on('close', () => this.sockets.delete(socket));
    let heard = '';
    let inMessage = false;
    const say = (line: string) => socket.write(`${line}\r\n`);
    const next = (end: string): string | undefined => {
      const at = heard.indexOf(end);
      if (at < 0) return undefined;
      const part = heard.slice(0, at);
      heard = heard.slice(at + end.length);
      return part;
    };
    say('220 tests');
    socket.setEncoding('utf8').on('data', (text) => {
      heard += String(text);
      for (let part = next(inMessage ? END_OF_MESSAGE : '\r\n'); part !== undefined;) {
        if (inMessage) {
          inMessage = false;
          this.messages.push(part);
          const answer = this.answer();
          if (answer !== null) say(answer);
        } else {
          inMessage = part === 'DATA';
          say(inMessage ? '354 go on' : part === 'QUIT' ? '221 bye' : '250 yes');
        }
        part = next(inMessage ? END_OF_MESSAGE : '\r\n');
      }
    });
  }
}
