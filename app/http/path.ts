/**
 * The page's path behind an address, whether it is asked for as a document or as its data: `/floor`, `/floor/`,
 * `/floor.data`, `/floor/_.data` and `/%66loor` are one page. Null when the address cannot be read.
 * Who may do what, and how often, is decided by this and by nothing else.
 */
export function pagePath(pathname: string): string | null {
  let path: string;
  try {
    path = decodeURI(pathname);
  } catch {
    return null;
  }
  if (path === "/_root.data") return "/";
  path = path.replace(/\/_\.data$|\.data$/, "").replace(/\/+$/, "");
  return path === "" ? "/" : path;
}
