const inside = (path: string, root: string): boolean => path === root || path.startsWith(`${root}/`);

/**
 * A path of the market as a path of the client that lives below `basename`; null when it belongs to another client.
 * `/sell/deals/D-1` is `/deals/D-1` of the seller's client and no page of the buyer's.
 */
export function withinClient(path: string, basename: string): string | null {
  const [pathname = ''] = path.split(/[?#]/);
  if (basename === '/') return inside(pathname, '/sell') || inside(pathname, '/desk') ? null : path;
  return inside(pathname, basename) ? path.slice(basename.length) || '/' : null;
}
