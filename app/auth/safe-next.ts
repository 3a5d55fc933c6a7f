/**
 * Where to go after signing in: a path of this site, or the Desk. Anything that a browser could read as another site
 * ("//host", "/\host", "https:…") becomes "/".
 */
export function safeNext(next: string | null | undefined): string {
  if (!next || !next.startsWith("/") || next.length > 2000) return "/";
  // Browsers drop tabs and line breaks and read a backslash as a slash before they look at an address.
  const url = parse(next);
  if (url === null || url.origin !== base) return "/";
  const path = url.pathname + url.search + url.hash;
  return path.startsWith("//") || /^\/(sign-in|sign-out|first-run)(\/|\?|$)/.test(path) ? "/" : path;
}

const base = "http://same-site.invalid";

function parse(next: string): URL | null {
  try {
    return new URL(next, base);
  } catch {
    return null;
  }
}
