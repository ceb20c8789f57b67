/**
 * Takes the pictures of the README's tour from the demo shop: start it (`npm start`), then `npm run tour`.
 * Uses Debian's Chromium, which `npm test` installs.
 */
import { mkdirSync, readFileSync } from "node:fs";
import { chromium } from "playwright";
import { inProject } from "./lib/project.mjs";

const origin = process.env.ORIGIN ?? "http://127.0.0.1:3000";
const signInsFile = process.env.DEMO_SIGN_INS_FILE ?? inProject(".data", "demo-sign-ins.json");
const { signIns } = JSON.parse(readFileSync(signInsFile, "utf8"));
const folder = inProject("docs", "tour");
mkdirSync(folder, { recursive: true });

const browser = await chromium.launch({
  executablePath: process.env.CHROMIUM_PATH ?? "/usr/bin/chromium",
  args: ["--no-sandbox", "--disable-gpu", "--disable-background-networking"],
});

/** A browser of somebody in that role. */
async function as(role, width, height) {
  const page = await browser.newPage({ baseURL: origin, viewport: { width, height } });
  const person = signIns.find((one) => one.role === role);
  await page.goto("/sign-in");
  await page.getByLabel("E-mail address").fill(person.email);
  await page.getByLabel("Password").fill(person.password);
  await page.getByRole("button", { name: "Sign in" }).click();
  await page.waitForURL((url) => url.pathname !== "/sign-in");
  return page;
}

async function take(page, path, name, options = {}) {
  await page.goto(path);
  // Screens that follow the shop say so once they do.
  if (options.live !== false) await page.getByText("Live", { exact: true }).first().waitFor();
  await page.evaluate(() => document.fonts.ready);
  await page.screenshot({ path: `${folder}/${name}.png` });
  console.log(`docs/tour/${name}.png`);
}

/** The address of a vehicle's layout, found the way a technician does: by its tag. */
async function layoutOf(page, code) {
  await page.goto(`/t/${code}`);
  return new URL(page.url()).pathname.replace(/\/step\/.*/, "");
}

const foreman = await as("foreman", 1440, 900);
await take(foreman, "/floor", "floor");
await take(foreman, "/wall", "wall");
const sunday = await layoutOf(foreman, "6QPM");
await take(foreman, `${sunday}/step/options`, "options");
await foreman.setViewportSize({ width: 900, height: 1180 });
await take(foreman, `${sunday}/sheet`, "sheet", { live: false });
const tech = await as("tech", 1024, 768);
const mule = await layoutOf(tech, "M3XF");
await take(tech, `${mule}/step/level`, "level");
await take(tech, `${mule}/step/drops`, "drops");
const counter = await as("counter", 1280, 800);
await take(counter, "/counter/book-in", "book-in", { live: false });
await take(counter, "/builds/1/tag", "tag", { live: false });
await browser.close();
