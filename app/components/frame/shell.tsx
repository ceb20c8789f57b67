import type { ReactNode } from "react";
import type { LiveStatus } from "../../realtime/live-status";
import type { ShellData } from "./areas";
import { TopBar } from "./top-bar";

/**
 * The frame of every signed-in page: the top bar, then the page.
 * @param live how live the page is; pages that keep no live data leave it out
 */
export function Shell({
  shell,
  live,
  children,
}: {
  shell: ShellData;
  live?: LiveStatus;
  children: ReactNode;
}) {
  return (
    <div className="flex min-h-dvh flex-col">
      <TopBar
        shopName={shell.shopName}
        isDemo={shell.isDemo}
        areas={shell.areas}
        person={shell.person}
        timeZone={shell.timeZone}
        now={shell.now}
        live={live?.state}
        lastHeard={live?.lastHeard ?? null}
      />
      {children}
    </div>
  );
}
