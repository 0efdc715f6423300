/** One line of the team's maps of sites. */
export interface SiteMapRow {
  id: string;
  name: string;
  sites: number;
  shots: number;
  device: string | null;
  firmware: string | null;
  group: string | null;
  statement: string;
  by: string | null;
  createdAt: number;
}

/** One page of them; `all` and `total` are the same, since nothing is filtered. */
export interface SiteMapList {
  rows: SiteMapRow[];
  total: number;
  all: number;
  page: number;
  size: number;
}
