/**
 * A path of this site from an address bar or a mail, or `fallback` when it would lead elsewhere: a host of
 * another site can hide behind `//host`, `/\host` or a full URL.
 */
export function localPath(value: string | undefined, fallback = "/"): string {
  if (!value || !value.startsWith("/")) return fallback;
  const base = "http://here.invalid";
  const url = URL.canParse(value, base) ? new URL(value, base) : null;
  return url && url.origin === base ? url.pathname + url.search + url.hash : fallback;
}
