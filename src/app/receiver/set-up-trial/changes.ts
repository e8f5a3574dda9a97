/** What is changed of a receiver: values under their paths, such as "bands.0.circuits.1.qLow". */
export type Changes = Readonly<Record<string, unknown>>;

type Node = Readonly<Record<string, unknown>>;

const isNode = (value: unknown): value is Node => typeof value === 'object' && value !== null;

/** Lists of another length, and parts that only one has, are changed as a whole. */
const canBeEntered = (from: unknown, to: unknown): boolean =>
  isNode(from) &&
  isNode(to) &&
  Array.isArray(from) === Array.isArray(to) &&
  Object.keys(from).join() === Object.keys(to).join();

/** The fewest changes that make one receiver from the other. */
export function changesBetween(from: unknown, to: unknown, path = ''): Changes {
  if (JSON.stringify(from) === JSON.stringify(to)) return {};
  if (path !== '' && !canBeEntered(from, to)) return { [path]: to };
  const [before, after] = [from as Node, to as Node];
  return Object.assign(
    {},
    ...Object.keys(after).map((key) =>
      changesBetween(before[key], after[key], path === '' ? key : `${path}.${key}`),
    ),
  ) as Changes;
}

/** The receiver with the changes made; it may no longer be one that can be built. */
export function applyChanges(receiver: object, changes: Changes): unknown {
  return Object.entries(changes).reduce<unknown>(
    (changed, [path, value]) => withValue(changed, path.split('.'), value),
    receiver,
  );
}

/** What lies under a path; undefined: nothing. */
export const valueAt = (receiver: unknown, path: string): unknown =>
  path.split('.').reduce<unknown>((node, key) => (isNode(node) ? node[key] : undefined), receiver);

function withValue(node: unknown, [key, ...rest]: readonly string[], value: unknown): unknown {
  if (key === undefined) return value;
  // A path that leads nowhere, from an address made for another set-up, changes nothing.
  if (!isNode(node) || !Object.hasOwn(node, key)) return node;
  const changed = withValue(node[key], rest, value);
  if (Array.isArray(node))
    return (node as unknown[]).map((each, at) => (String(at) === key ? changed : each));
  return { ...node, [key]: changed };
}
