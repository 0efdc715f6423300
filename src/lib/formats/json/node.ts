/**
 * A JSON value with its place. Numbers keep their digits, so that none is rounded before it is
 * checked; members keep their order and their repeats, so that a count given twice is seen; keys
 * stay strings in a list, so that `__proto__` is a key like any other.
 */
export type JsonNode =
  | { kind: 'object'; at: number; members: { key: string; at: number; value: JsonNode }[] }
  | { kind: 'array'; at: number; items: JsonNode[] }
  | { kind: 'number'; at: number; raw: string }
  | { kind: 'string'; at: number; value: string }
  | { kind: 'literal'; at: number; value: boolean | null };

/** First member with that key, if the node is an object that has it. */
export function member(node: JsonNode, key: string): JsonNode | null {
  if (node.kind !== 'object') return null;
  return node.members.find((entry) => entry.key === key)?.value ?? null;
}

/** The node in words, for messages. */
export function describe(node: JsonNode): string {
  switch (node.kind) {
    case 'object':
      return 'an object';
    case 'array':
      return 'a list';
    case 'string':
      return 'a text';
    case 'number':
      return `the number ${node.raw.slice(0, 30)}`;
    case 'literal':
      return String(node.value);
  }
}
