import { createCookie, data, redirect } from "react-router";
import { env } from "~/env.server";

const cookies = new Map<string, ReturnType<typeof createCookie>>();

function cookieOf(name: string, path: string) {
  const known = cookies.get(name);
  if (known) return known;
  const made = createCookie(`plumbay_${name}`, {
    httpOnly: true,
    sameSite: "lax",
    path,
    secure: env().COOKIE_SECURE === "1",
    maxAge: 60 * 60 * 24 * 90,
  });
  cookies.set(name, made);
  return made;
}

/**
 * Keeps a list's filters for the next visit of this browser. An address without any filter goes on to the remembered
 * one; an address with filters is remembered.
 * @throws a redirect to the remembered address
 */
export async function remembered<T>(request: Request, name: string, path: string, show: () => Promise<T>) {
  const cookie = cookieOf(name, path);
  const { searchParams } = new URL(request.url);
  searchParams.delete("_routes");
  if (searchParams.size === 0) {
    const kept: unknown = await cookie.parse(request.headers.get("cookie"));
    if (typeof kept === "string" && kept !== "") throw redirect(`${path}?${kept}`);
    return data(await show());
  }
  // What was searched for is over with the search; how the list stands is not.
  searchParams.delete("q");
  return data(await show(), {
    headers: { "Set-Cookie": await cookie.serialize(searchParams.toString().slice(0, 400)) },
  });
}
