import { redirect } from "react-router";
import { actorContext } from "~/context";
import type { ActorRole } from "~/domain/people/roles";
import type { Route } from "./+types/home";

/** The page each role works on. */
const FIRST_PAGE: Record<ActorRole, string> = {
  owner: "/floor",
  foreman: "/floor",
  tech: "/scan",
  counter: "/counter",
  display: "/wall",
  token: "/api/docs",
};

export function loader({ context }: Route.LoaderArgs) {
  const actor = context.get(actorContext);
  throw redirect(actor ? FIRST_PAGE[actor.role] : "/sign-in");
}

export default function Home() {
  return null;
}
