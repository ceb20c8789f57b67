import "./app.css";
import {
  isRouteErrorResponse,
  Links,
  Meta,
  Outlet,
  Scripts,
  ScrollRestoration,
  useRouteError,
} from "react-router";
import type { Route } from "./+types/root";
import { sessionSecret } from "./auth/cookie.server";
import { actorFromSecret } from "./auth/sessions.server";
import { actorFromToken, bearerOf } from "./auth/tokens.server";
import { FaultPage } from "./components/frame/fault-page";
import { actorContext, appContext } from "./context";
import { guardRequest } from "./http/request.server";
import { SignSprite } from "./ui/sign";

/** Before any loader or action: who asks, and may they? */
export const middleware: Route.MiddlewareFunction[] = [
  async ({ request, context }) => {
    const { db, now } = context.get(appContext);
    // A request with a token is a program's: its cookies, if any, count for nothing.
    const token = bearerOf(request.headers.get("authorization"));
    const actor = token
      ? await actorFromToken(db, token, now())
      : await actorFromSecret(db, await sessionSecret(request.headers.get("cookie")), now());
    context.set(actorContext, actor);
    guardRequest(request, actor);
  },
];

/** Keeps the middleware in the way of every client navigation: without a loader there would be no request. */
export const loader = () => null;

/** What a page shows follows from its own loader; the frame itself never changes by itself. */
export const shouldRevalidate = () => false;

export const meta: Route.MetaFunction = () => [{ title: "Plumbay" }, { name: "robots", content: "noindex" }];

export function Layout({ children }: { children: React.ReactNode }) {
  return (
    <html lang="en">
      <head>
        <meta charSet="utf-8" />
        <meta name="viewport" content="width=device-width, initial-scale=1" />
        <link rel="icon" href="/favicon.svg" type="image/svg+xml" />
        <Meta />
        <Links />
      </head>
      <body>
        <SignSprite />
        {children}
        <ScrollRestoration />
        <Scripts />
      </body>
    </html>
  );
}

export default function App() {
  return <Outlet />;
}

export function ErrorBoundary() {
  const error = useRouteError();
  if (isRouteErrorResponse(error)) {
    const words =
      typeof error.data === "object" && error.data && "message" in error.data
        ? String(error.data.message)
        : null;
    return <FaultPage status={error.status} words={words} />;
  }
  return <FaultPage status={500} words={null} />;
}
