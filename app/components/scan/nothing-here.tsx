import { Link } from "react-router";
import { ScanField } from "./scan-field";

/** The page for an address that leads nowhere, with the ways on that are open to whoever asks. */
export function NothingHere({
  areas,
  mayScan,
  signedIn,
}: {
  areas: readonly { to: string; label: string }[];
  mayScan: boolean;
  signedIn: boolean;
}) {
  return (
    <main className="mx-auto grid w-full max-w-xl content-start gap-8 p-6 pt-12">
      <div className="grid gap-2">
        <p className="label">404</p>
        <h1 className="font-label font-semibold text-4xl">Nothing hangs here</h1>
        <p className="text-lg">The address may be mistyped, or what was here has left the shop.</p>
      </div>
      {mayScan ? <ScanField focus /> : null}
      {areas.length > 0 ? (
        <nav aria-label="Ways on" className="grid gap-2">
          <h2 className="label">Or go to</h2>
          <ul className="flex flex-wrap gap-x-6 gap-y-1">
            {areas.map((area) => (
              <li key={area.to}>
                <Link
                  className="inline-flex min-h-11 items-center font-medium text-line text-lg underline"
                  to={area.to}
                >
                  {area.label}
                </Link>
              </li>
            ))}
          </ul>
        </nav>
      ) : null}
      {signedIn ? null : (
        <Link className="font-medium text-line text-lg underline" to="/sign-in">
          Sign in
        </Link>
      )}
    </main>
  );
}
