import { z } from "zod";

const Env = z.object({
  NODE_ENV: z.enum(["development", "production", "test"]).default("production"),
  DATABASE_URL: z.string().min(1, "DATABASE_URL is missing: start the shop with `npm start`"),
  SESSION_SECRET: z.string().min(32, "SESSION_SECRET is missing: start the shop with `npm start`"),
  /** "1" when served over https: cookies become Secure and browsers are told to stay on https. */
  COOKIE_SECURE: z.enum(["0", "1"]).default("0"),
  /** Number of proxies in front, for the visitor's address. Never "all": the visitor could then choose it. */
  TRUST_PROXY: z.coerce.number().int().min(0).max(5).default(0),
  /** The address printed in tags, such as http://192.168.1.20:3000. Empty: the address the printing browser used. */
  PUBLIC_ORIGIN: z.string().default(""),
  LOG_LEVEL: z.enum(["fatal", "error", "warn", "info", "debug", "silent"]).default("info"),
  /** Sign-in tries a minute from one address; a whole shop shares one. */
  SIGN_IN_PER_MINUTE: z.coerce.number().int().min(1).default(30),
  /** Calculations a minute asked for by one token, or from one address without one. */
  CALC_PER_MINUTE: z.coerce.number().int().min(1).default(240),
});
export type Env = z.infer<typeof Env>;

let parsed: Env | undefined;

/** The settings of this process, read once. Throws with every fault named when one is missing or wrong. */
export function env(): Env {
  if (!parsed) {
    const result = Env.safeParse(process.env);
    if (!result.success) throw new Error(result.error.issues.map((issue) => issue.message).join("\n"));
    parsed = Object.freeze(result.data);
  }
  return parsed;
}
