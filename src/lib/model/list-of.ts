import { z } from 'zod';

/**
 * A list whose first misfit is told, and no other: `z.array` makes an object of every one, and three million took
 * 2.5 GB. For lists of any length from outside; what is given back is what was given.
 */
export const listOf = <Item extends z.ZodType>(item: Item) =>
  z.custom<z.output<Item>[]>(Array.isArray, { error: 'must be a list' }).superRefine((list, context) => {
    for (const [at, one] of list.entries()) {
      const read = item.safeParse(one);
      if (read.success) continue;
      const [{ path, message }] = read.error.issues;
      context.addIssue({ code: 'custom', path: [at, ...path], message });
      return;
    }
  });
