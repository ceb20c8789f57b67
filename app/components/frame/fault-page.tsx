import { Link } from "react-router";

const HEAD: Record<number, string> = {
  401: "Sign in first",
  403: "Not for your role",
  404: "Nothing hangs here",
  405: "That cannot be done here",
  409: "Somebody was faster",
};

const HELP: Record<number, string> = {
  403: "Somebody with another role has to do this. Ask the foreman.",
  404: "The address may be mistyped, or what was here has left the shop.",
};

/** The page for what went wrong: what it was, in words, and the way back. */
export function FaultPage({ status, words }: { status: number; words: string | null }) {
  const head = HEAD[status] ?? (status >= 500 ? "The shop's server stumbled" : "That did not work");
  const help =
    words ??
    HELP[status] ??
    "Nothing that you kept before was lost. Try again; if it stays so, tell whoever looks after the server the time.";
  return (
    <main className="mx-auto grid min-h-dvh max-w-xl content-center gap-4 p-8">
      <p className="label">{status}</p>
      <h1 className="font-label text-4xl font-semibold">{head}</h1>
      <p className="text-lg">{help}</p>
      <p className="flex gap-4">
        <Link className="font-medium text-line underline" to="/">
          Back to your first page
        </Link>
        {status === 401 || status === 403 ? (
          <Link className="font-medium text-line underline" to="/sign-in">
            Sign in as somebody else
          </Link>
        ) : null}
      </p>
    </main>
  );
}
