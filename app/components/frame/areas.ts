import type { Permission } from "../../auth/permissions";

/** What every signed-in page is framed by. Made on the server, shown by Shell. */
export type ShellData = {
  shopName: string;
  isDemo: boolean;
  timeZone: string;
  unit: "in" | "mm";
  person: { name: string; role: string; initials: string };
  areas: { to: string; label: string }[];
  /** The server's clock when the page was made, so that the first picture is the same on both sides. */
  now: string;
};

/** The areas of the shop in the order of the top bar, each with the permission that opens it. */
export const AREAS: readonly { to: string; label: string; needs: Permission }[] = [
  { to: "/floor", label: "Floor", needs: "floor:see" },
  { to: "/counter", label: "Counter", needs: "counter:see" },
  { to: "/springs", label: "Spring rack", needs: "springs:see" },
  { to: "/wall", label: "Wall", needs: "wall:see" },
  { to: "/setup", label: "Setup", needs: "setup:see" },
];
