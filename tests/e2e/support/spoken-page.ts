import type { Page } from 'playwright-core';

/** One thing as a screen reader is told of it. */
export interface Spoken {
  role: string;
  name: string;
  /** Level of a heading. */
  level: number | null;
  /** Name of the group it stands in, such as a fieldset's legend: told before the thing itself. */
  group: string;
}

/** What the browser tells a screen reader of the page, in reading order, without what it passes over. */
export async function spokenPage(page: Page): Promise<Spoken[]> {
  const session = await page.context().newCDPSession(page);
  const { nodes } = await session.send('Accessibility.getFullAXTree');
  await session.detach();
  const byId = new Map(nodes.map((node) => [node.nodeId, node]));
  const spoken: Spoken[] = [];
  const walk = (id: string, group: string): void => {
    const node = byId.get(id);
    if (!node) return;
    const role = String(node.role?.value ?? '');
    const name = String(node.name?.value ?? '').trim();
    if (!node.ignored)
      spoken.push({
        role,
        name,
        group,
        level: Number(node.properties?.find(({ name }) => name === 'level')?.value.value) || null
      });
    for (const child of node.childIds ?? []) walk(child, role === 'group' && name ? name : group);
  };
  if (nodes.length) walk(nodes[0].nodeId, '');
  return spoken;
}
