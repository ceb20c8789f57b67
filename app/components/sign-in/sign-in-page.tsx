import { Form, Link, useNavigation } from "react-router";
import { Bob } from "../../ui/bob";
import { Button } from "../../ui/button";
import { Field } from "../../ui/field";

/** The door: a plumb line hangs to the floor beside the form. */
export function SignInPage({
  signedIn,
  demoShop,
  refused,
}: {
  /** Who is signed in on this browser already; null: nobody. */
  signedIn: string | null;
  /** The made-up shop's name; null when this database has none. */
  demoShop: string | null;
  refused: { message: string; email: string } | null;
}) {
  const busy = useNavigation().state !== "idle";
  return (
    <main className="grid min-h-dvh grid-cols-[minmax(0,1fr)] bg-concrete-100 md:grid-cols-[minmax(0,5fr)_minmax(0,6fr)]">
      <HangingBob />
      <div className="grid content-center gap-6 bg-chalk p-6 sm:p-12 lg:px-20">
        <header className="grid gap-1">
          <p className="flex items-center gap-2 font-label font-semibold text-2xl">
            <Bob size={40} className="md:hidden" />
            Plumbay
          </p>
          <h1 className="font-label font-semibold text-4xl leading-tight">Sign in to your shop</h1>
        </header>
        {signedIn ? (
          <p className="max-w-md border-brass border-l-4 bg-brass-wash px-4 py-3">
            {signedIn} is signed in on this browser. Signing in as somebody else ends that.{" "}
            <Link className="font-medium text-line underline" to="/">
              Go on as {signedIn.split(" ")[0]}
            </Link>
          </p>
        ) : null}
        <Form method="post" className="grid max-w-md gap-5" aria-label="Sign in">
          {refused ? (
            <p
              role="alert"
              className="border-oxide border-l-4 bg-oxide-wash px-4 py-3 font-medium text-oxide"
            >
              {refused.message}
            </p>
          ) : null}
          <Field
            label="E-mail address"
            name="email"
            type="email"
            autoComplete="username"
            inputMode="email"
            autoCapitalize="none"
            spellCheck={false}
            required
            autoFocus={!refused}
            defaultValue={refused?.email}
          />
          <Field
            label="Password"
            name="password"
            type="password"
            autoComplete="current-password"
            required
            autoFocus={refused !== null}
          />
          <div>
            <Button tone="go" size="l" type="submit" busy={busy}>
              Sign in
            </Button>
          </div>
        </Form>
        <p className="max-w-md text-concrete-700">
          {demoShop ? (
            <>
              <b className="font-semibold text-ink">Demo shop.</b> {demoShop} is made up:{" "}
              <b className="font-semibold text-ink">npm start</b> printed its sign-ins where it was started.
            </>
          ) : (
            "No way in? Ask the owner of your shop."
          )}
        </p>
      </div>
    </main>
  );
}

/** A plumb line from the top of the page to a cross on the floor. */
function HangingBob() {
  return (
    <div className="relative hidden overflow-hidden md:block" aria-hidden="true">
      <svg
        aria-hidden="true"
        viewBox="0 0 600 900"
        preserveAspectRatio="xMidYMax slice"
        className="absolute inset-0 h-full w-full"
      >
        <g stroke="#dcd9d1" strokeWidth="1.5">
          <path d="M0 700H600M0 560H600M0 840H600M90 0V900M300 0V900M510 0V900" />
        </g>
        <path d="M40 748L560 692" stroke="#24599c" strokeOpacity=".16" strokeWidth="9" />
        <path d="M40 748L560 692" stroke="#24599c" strokeWidth="2.2" />
        <g fill="none" stroke="#24599c" strokeWidth="2.2">
          <circle cx="86" cy="743" r="11" />
          <circle cx="514" cy="697" r="11" />
          <path d="M300 696V744M268 723L332 717" />
        </g>
        <text x="62" y="786" className="fill-line font-label" fontSize="24" fontWeight="600">
          A
        </text>
        <text x="508" y="742" className="fill-line font-label" fontSize="24" fontWeight="600">
          B
        </text>
        <path d="M300 0V560" stroke="#7f540b" strokeWidth="2.4" />
        <path d="M288 560h24l2 12h-28z" fill="#7f540b" />
        <path
          d="M280 572h40l4 22-24 112-24-112z"
          fill="#a8741a"
          stroke="#7f540b"
          strokeWidth="2.2"
          strokeLinejoin="round"
        />
        <path d="M300 580l12 14-12 84z" fill="#7f540b" opacity=".38" />
      </svg>
    </div>
  );
}
