import { connect, createServer, type Socket } from "node:net";

/** A network cable to the server that can be pulled: connections die at once, new ones find nobody. */
export class Cable {
  private readonly open = new Set<Socket>();
  private pulled = false;
  private constructor(
    readonly origin: string,
    private readonly server: ReturnType<typeof createServer>,
  ) {}

  static async to(target: string): Promise<Cable> {
    const { hostname, port } = new URL(target);
    const server = createServer();
    await new Promise<void>((resolve) => server.listen(0, "127.0.0.1", resolve));
    const address = server.address();
    if (!address || typeof address === "string") throw new Error("The cable found no port");
    const cable = new Cable(`http://127.0.0.1:${address.port}`, server);
    server.on("connection", (near) => {
      if (cable.pulled) return near.destroy();
      const far = connect(Number(port), hostname);
      for (const [one, other] of [
        [near, far],
        [far, near],
      ] as const) {
        cable.open.add(one);
        one.on("error", () => other.destroy());
        one.on("close", () => {
          cable.open.delete(one);
          other.destroy();
        });
        one.pipe(other);
      }
    });
    return cable;
  }

  pull(): void {
    this.pulled = true;
    for (const socket of this.open) socket.destroy();
  }
  plugIn(): void {
    this.pulled = false;
  }
  async remove(): Promise<void> {
    this.pull();
    await new Promise((resolve) => this.server.close(resolve));
  }
}
