import { data, matchPath, type RouterContextProvider, redirect } from "react-router";
import { ACCESS, type Need } from "../auth/access";
import type { Actor } from "../auth/actor";
import { may, type Permission } from "../auth/permissions";
import { actorContext, appContext } from "../context";
import { env } from "../env.server";
import type { Context } from "../services/change.server";
import { Refusal } from "../services/errors";
import { pagePath } from "./path";

type Ctx = Readonly<RouterContextProvider>;

/** What a request needs by the access table; null when the table does not know the path or the method. */
export function needOf(path: string, method: string): Need | null {
  const row = ACCESS.find((row) => matchPath({ path: row.path, end: true }, path) !== null);
  if (!row) return null;
  if (method === "GET" || method === "HEAD") return row.GET ?? null;
  if (method === "POST") return row.POST ?? null;
  return null;
}

const wantsPage = (request: Request) =>
  request.method === "GET" && (request.headers.get("accept") ?? "").includes("text/html");

/** Signs that some reader of addresses drops or turns: with them a path could become another site's address. */
const ODD_SIGNS = /[^\u0021-\u007e]|\\/;

/** Where a person goes on after signing in: a path of ours, never another site. */
export function safeReturn(to: string | null): string {
  if (to === null || !to.startsWith("/") || to.startsWith("//") || ODD_SIGNS.test(to)) return "/";
  const here = "http://here.invalid";
  const url = URL.parse(to, here);
  return url?.origin === here ? url.pathname + url.search : "/";
}

/** Refuses a request that the access table does not allow to this actor. */
export function guardRequest(request: Request, actor: Actor | null): void {
  const path = pagePath(new URL(request.url).pathname);
  if (path === null) throw data({ message: "There is no such page." }, { status: 404 });
  const need = needOf(path, request.method);
  if (need === null) throw data({ message: "There is nothing that takes this." }, { status: 405 });
  if (need === "anyone") return;
  if (!actor) {
    const isData = new URL(request.url).pathname.endsWith(".data");
    if (wantsPage(request) || isData) {
      const { search } = new URL(request.url);
      const clean = new URLSearchParams(search);
      clean.delete("_routes");
      const back = clean.size > 0 ? `${path}?${clean}` : path;
      throw redirect(request.method === "GET" ? `/sign-in?to=${encodeURIComponent(back)}` : "/sign-in");
    }
    throw data({ message: "Sign in first." }, { status: 401 });
  }
  if (need !== "signed-in" && !may(actor.role, need))
    throw data({ message: "This is not for your role." }, { status: 403 });
}

/** The actor of a loader, proved to have the permission. Every loader asks for itself: a parent's check protects nobody. */
export function requireActor(context: Ctx, permission: Permission): Actor {
  const actor = context.get(actorContext);
  if (!actor) throw redirect("/sign-in");
  if (!may(actor.role, permission)) throw data({ message: "This is not for your role." }, { status: 403 });
  return actor;
}

/** What a service needs, from a route's context. */
export function serviceContext(context: Ctx): Context {
  const actor = context.get(actorContext);
  if (!actor) throw data({ message: "Sign in first." }, { status: 401 });
  const { db, publish, now } = context.get(appContext);
  return { db, publish, actor, now };
}

/** What every action of ours answers: done, or refused in words, with what was typed. */
export type Answer<T = Record<string, unknown>> =
  | ({ ok: true } & T)
  | {
      ok: false;
      kind: string;
      message: string;
      fields: Record<string, string>;
      typed: Record<string, string>;
      detail: Record<string, unknown>;
    };

/** The form's text fields as typed; files are left out, passwords too. */
export function typedOf(form: FormData): Record<string, string> {
  const typed: Record<string, string> = {};
  for (const [name, value] of form) if (typeof value === "string" && name !== "password") typed[name] = value;
  return typed;
}

/**
 * Runs an action's work and shapes its answer. A Refusal becomes its status with words beside the fields and what was
 * typed; anything else is a fault and goes on to the error page and the log.
 */
export async function answer<T extends Record<string, unknown>>(
  form: FormData,
  work: () => Promise<T>,
): Promise<ReturnType<typeof data<Answer<T>>>> {
  try {
    return data<Answer<T>>({ ok: true, ...(await work()) });
  } catch (error) {
    if (!(error instanceof Refusal)) throw error;
    const { kind, message, fields, detail, status } = error;
    return data<Answer<T>>({ ok: false, kind, message, fields, typed: typedOf(form), detail }, { status });
  }
}

/** A loader's refusal as the response of its status, for the error page. */
export async function orErrorPage<T>(work: () => Promise<T>): Promise<T> {
  try {
    return await work();
  } catch (error) {
    if (error instanceof Refusal) throw data({ message: error.message }, { status: error.status });
    throw error;
  }
}

/** A number from a route's path. @throws 404 */
export function idParam(value: string | undefined): number {
  if (!/^[1-9]\d{0,14}$/.test(value ?? ""))
    throw data({ message: "There is no such page." }, { status: 404 });
  return Number(value);
}

/** The address that tags and sheets carry: the one set for the shop, or the one this request came to. */
export const publicOrigin = (request: Request): string => env().PUBLIC_ORIGIN || new URL(request.url).origin;
