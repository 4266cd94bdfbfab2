/** The item a path belongs to: itself or the nearest page above it. "/rounds/12" belongs to "/rounds", "/roundsman" does not. */
export function currentHref(hrefs: readonly string[], pathname: string): string | null {
  const above = hrefs.filter(
    (href) => pathname === href || pathname.startsWith(href.endsWith("/") ? href : `${href}/`),
  );
  return above.reduce<string | null>((best, href) => (best === null || href.length > best.length ? href : best), null);
}
