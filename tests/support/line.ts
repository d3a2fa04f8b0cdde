/**
 * A line between a browser and the app's server: counts what goes over it, as a phone would pay for it, and may
 * hold back or change answers.
 */
import { createServer, request, type Server, type ServerResponse } from "node:http";

export interface Counted {
  path: string;
  /** Bytes of the body as sent, compressed where the server compresses. */
  bytes: number;
}

export class Line {
  readonly counted: Counted[] = [];
  /** Answers to paths that match are held back until `release`. */
  holdBack: RegExp | null = null;
  /** Paths that match are answered by 502. */
  refuse: RegExp | null = null;
  refused = 0;
  /** Text put behind the server's answer, by path. */
  readonly appended = new Map<string, string>();
  private server: Server | undefined;
  private held: { pass(): void; outgoing: ServerResponse }[] = [];

  constructor(
    readonly port: number,
    private readonly target: number,
  ) {}

  get url(): string {
    return `http://localhost:${this.port}`;
  }

  async start(): Promise<void> {
    this.server = createServer((incoming, outgoing) => {
      const path = incoming.url ?? "";
      const pass = () => {
        const headers = { ...incoming.headers };
        if (this.appended.has(path))
          for (const name of ["accept-encoding", "if-none-match", "if-modified-since"]) delete headers[name];
        const passed = request({ port: this.target, path, method: incoming.method, headers }, (response) => {
          const entry: Counted = { path, bytes: 0 };
          this.counted.push(entry);
          const more = this.appended.get(path);
          const passedOn = { ...response.headers };
          if (more !== undefined) {
            delete passedOn["content-length"];
            delete passedOn.etag;
          }
          outgoing.writeHead(response.statusCode ?? 500, passedOn);
          response.on("data", (chunk: Buffer) => {
            entry.bytes += chunk.length;
            outgoing.write(chunk);
          });
          response.on("end", () => outgoing.end(more ?? ""));
        });
        passed.on("error", () => refuse(outgoing));
        incoming.pipe(passed);
      };
      if (this.refuse?.test(path)) {
        this.refused++;
        refuse(outgoing);
      } else if (this.holdBack?.test(path)) this.held.push({ pass, outgoing });
      else pass();
    });
    await new Promise<void>((resolve) => this.server!.listen(this.port, resolve));
  }

  release(): void {
    this.holdBack = null;
    for (const { pass } of this.held.splice(0)) pass();
  }

  /** Answers what is held back, and what is asked like it from now on, by 502. */
  refuseHeld(): void {
    this.refuse = this.holdBack;
    this.holdBack = null;
    for (const { outgoing } of this.held.splice(0)) refuse(outgoing);
  }

  stop(): void {
    this.server?.closeAllConnections();
    this.server?.close();
  }

  /** Sums by part of the app. */
  byPart(): Map<string, number> {
    const sums = new Map<string, number>();
    for (const { path, bytes } of this.counted) {
      const part = partOf(path);
      sums.set(part, (sums.get(part) ?? 0) + bytes);
    }
    return sums;
  }
}

function refuse(outgoing: ServerResponse): void {
  if (!outgoing.headersSent) outgoing.writeHead(502);
  outgoing.end();
}

function partOf(path: string): string {
  if (path.startsWith("/pglite/")) return "database (PGlite)";
  if (path.startsWith("/fonts/")) return "fonts for print";
  if (/\.woff2/.test(path)) return "fonts for the screen";
  if (/\.css/.test(path)) return "styles";
  if (/\/_next\/.*\.js|\/sw\.js/.test(path)) return "programs";
  if (path.startsWith("/icons/") || path.startsWith("/manifest")) return "icons and manifest";
  return "screens (pages and payloads)";
}
