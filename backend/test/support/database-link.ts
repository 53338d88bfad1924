import { once } from 'node:events';
import { type AddressInfo, connect, createServer, type Server, type Socket } from 'node:net';

/** A line between application and database that can be cut and mended. */
export class DatabaseLink {
  private server?: Server;
  private readonly sockets = new Set<Socket>();
  port = 0;

  constructor(
    private readonly databaseHost: string,
    private readonly databasePort: number,
  ) {}

  async mend(): Promise<void> {
    this.server = createServer((socket) => this.join(socket));
    this.server.listen(this.port, '127.0.0.1');
    await once(this.server, 'listening');
    this.port = (this.server.address() as AddressInfo).port;
  }

  async cut(): Promise<void> {
    const closed = new Promise((resolve) => this.server?.close(resolve));
    for (const socket of this.sockets) socket.destroy();
    await closed;
  }

  private join(socket: Socket): void {
    const database = connect(this.databasePort, this.databaseHost);
    for (const [from, to] of [
      [socket, database],
      [database, socket],
    ]) {
      this.sockets.add(from);
      from.pipe(to);
      from.on('error', () => to.destroy());
      from.on('close', () => this.sockets.delete(from));
    }
  }
}
