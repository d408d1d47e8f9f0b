import fc from "fast-check";

type Container = Record<string | number, unknown>;

/** A member of an object or array somewhere in a value. */
interface Place {
  readonly container: Container;
  readonly key: string | number;
}

/** What a careless edit may put in place of anything. */
const oddValues: readonly unknown[] = [
  ...[undefined, null, true, "", "1", "x", "x".repeat(501), "x".repeat(1001)],
  ...[Number.NaN, Number.POSITIVE_INFINITY, -1, -0, 0, 0.5, 1, 1.5, 8.314, 25, 95, 298.15, 1e-320, 1e308, -273.15],
  ...[1n, Symbol("odd"), () => 1, [], {}, [1], [undefined], { text: "another source" }, { text: "" }, { value: 1 }],
];

const extraKeys = ["note", "Value", "__proto__", "constructor", "prototype", "", "0", "where", "uncertainty", "anchor"];

function isContainer(value: unknown): value is Container {
  return typeof value === "object" && value !== null;
}

function copyOf(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(copyOf);
  if (!isContainer(value)) return value;
  const copy = {};
  for (const [key, member] of Object.entries(value)) define(copy, key, copyOf(member));
  return copy;
}

/** Sets an own member, `__proto__` too. */
function define(container: object, key: string | number, value: unknown): void {
  Object.defineProperty(container, key, { value, enumerable: true, writable: true, configurable: true });
}

/** All places, outer ones first; one array is filled, for records have thousands. */
function placesIn(value: unknown, places: Place[] = []): Place[] {
  if (!isContainer(value)) return places;
  for (const key of Object.keys(value)) {
    places.push({ container: value, key });
    placesIn(value[key], places);
  }
  return places;
}

/** A change of one kind at a place; the number chooses among the ways to do it. */
type Mutation = (place: Place, choice: number, words: readonly unknown[]) => void;

const pick = <T>(values: readonly T[], choice: number): T => values[choice % values.length]!;

const mutations: readonly Mutation[] = [
  // take out
  ({ container, key }) => {
    if (Array.isArray(container)) container.splice(Number(key), 1);
    else delete container[key];
  },
  // another value
  ({ container, key }, choice) => define(container, key, copyOf(pick(oddValues, choice))),
  // another word or number of the trade
  ({ container, key }, choice, words) => define(container, key, copyOf(pick(words, choice))),
  // a key too many
  ({ container, key }, choice) => {
    const target = isContainer(container[key]) ? container[key] : container;
    if (Array.isArray(target)) target.push(copyOf(pick(oddValues, choice)));
    else define(target, pick(extraKeys, choice), copyOf(pick(oddValues, choice + 7)));
  },
  // another number
  ({ container, key }, choice) => {
    const value = container[key];
    if (typeof value !== "number") return;
    define(container, key, pick([-value, value + 1, value / 2, value * 1e3, Math.round(value), value - 0.25], choice));
  },
  // two members change places
  ({ container, key }, choice) => {
    const other = pick(Object.keys(container), choice);
    const value = container[key];
    define(container, key, container[other]);
    define(container, other, value);
  },
  // an entry twice, or a hole
  ({ container, key }, choice) => {
    if (!Array.isArray(container)) return;
    if (choice % 3 === 0) container.length += 1;
    else container.splice(Number(key), 0, copyOf(container[Number(key)]));
  },
];

/**
 * Values that are sound, or almost: up to three changes anywhere in a sound one.
 *
 * @param sound - what is changed
 * @param words - what is sound somewhere in such values: units, states, labels
 */
export function mutated(sound: fc.Arbitrary<unknown>, words: readonly unknown[]): fc.Arbitrary<unknown> {
  const change = fc.tuple(fc.nat(), fc.nat(mutations.length - 1), fc.nat());
  return fc.tuple(sound, fc.array(change, { maxLength: 3 })).map(([value, changes]) => {
    const holder = { value: copyOf(value) };
    for (const [where, kind, choice] of changes) {
      const places = placesIn(holder);
      if (places.length > 0) mutations[kind]!(pick(places, where), choice, words);
    }
    return holder.value;
  });
}
