import { PassThrough } from "node:stream";
import { createReadableStreamFromReadable } from "@react-router/node";
import { isbot } from "isbot";
import { type RenderToPipeableStreamOptions, renderToPipeableStream } from "react-dom/server";
import { type EntryContext, type RouterContextProvider, ServerRouter } from "react-router";
import { nonceContext } from "./context";

/** How long a page may take to stream before it is cut off. */
export const streamTimeout = 5_000;

export default function handleRequest(
  request: Request,
  statusCode: number,
  headers: Headers,
  routerContext: EntryContext,
  loadContext: RouterContextProvider,
) {
  if (request.method.toUpperCase() === "HEAD") return new Response(null, { status: statusCode, headers });
  const nonce = loadContext.get(nonceContext);
  const userAgent = request.headers.get("user-agent");
  const whenReady: keyof RenderToPipeableStreamOptions =
    userAgent && isbot(userAgent) ? "onAllReady" : "onShellReady";

  return new Promise<Response>((resolve, reject) => {
    let status = statusCode;
    let shellSent = false;
    let timer: ReturnType<typeof setTimeout> | undefined;
    const { pipe, abort } = renderToPipeableStream(
      <ServerRouter context={routerContext} url={request.url} nonce={nonce} />,
      {
        nonce,
        [whenReady]() {
          shellSent = true;
          const body = new PassThrough({
            final(done) {
              clearTimeout(timer);
              done();
            },
          });
          headers.set("Content-Type", "text/html");
          pipe(body);
          resolve(new Response(createReadableStreamFromReadable(body), { status, headers }));
        },
        onShellError: reject,
        onError(error: unknown) {
          status = 500;
          // Before the shell is sent the error is logged by whoever catches the rejection.
          if (shellSent) console.error(error);
        },
      },
    );
    timer = setTimeout(abort, streamTimeout + 1000);
  });
}

/** Faults of loaders and actions; refusals are answers and do not come here. */
export function handleError(error: unknown, { request }: { request: Request }) {
  if (!request.signal.aborted) console.error(withoutValues(error));
}

/** A database fault names what was typed: the log keeps the query, the code and the place, never the values. */
function withoutValues(error: unknown): unknown {
  if (!(error instanceof Error) || !("query" in error)) return error;
  const code =
    error.cause && typeof error.cause === "object" && "code" in error.cause ? error.cause.code : "";
  const place = (error.stack ?? "").split("\n").filter((line) => line.startsWith("    at "));
  return [`A query failed (${String(code)}): ${String(error.query)}`, ...place].join("\n");
}
