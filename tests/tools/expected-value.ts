/**
 * What an example shows after `// =>`: a JavaScript literal in which `...` stands for what is not shown.
 *
 * - `5708.0...` a number whose decimal digits begin so (cut, not rounded); other numbers, texts, true, false, null and
 *   undefined are equal exactly;
 * - `[1, 2, ...]`, `{ a: 1, ... }` further elements or properties may follow;
 * - `Float64Array [1, 2]` an array of that class.
 */
export type Expected =
  | { readonly kind: "same"; readonly value: unknown }
  | { readonly kind: "bigint"; readonly text: string }
  | { readonly kind: "digits"; readonly digits: string }
  | {
      readonly kind: "array";
      readonly className: string;
      readonly elements: readonly Expected[];
      readonly open: boolean;
    }
  | { readonly kind: "object"; readonly properties: Readonly<Record<string, Expected>>; readonly open: boolean };

/** Reads the text after `// =>`; throws an Error that tells where it stops being readable. */
export function parseExpected(text: string): Expected {
  let position = 0;
  const result = value();
  if (skipSpace() < text.length) stop("the end");
  return result;

  function value(): Expected {
    skipSpace();
    const array = take(/^(?:((?:Float|Int|Uint|BigInt|BigUint)\d+Array)\s*)?\[/);
    if (array !== undefined) return arrayAfterBracket(array[1] ?? "Array");
    if (take(/^\{/) !== undefined) return objectAfterBrace();
    const digits = take(/^(-?\d+(?:\.\d+)?)(?:\.\.\.|…)(e[+-]?\d+)?/);
    if (digits !== undefined) return { kind: "digits", digits: `${digits[1]}${digits[2] ?? ""}` };
    const bigint = take(/^-?\d+n\b/);
    if (bigint !== undefined) return { kind: "bigint", text: bigint[0].slice(0, -1) };
    const number = take(/^-?\d+(?:\.\d+)?(?:e[+-]?\d+)?(?![\w.])/i);
    if (number !== undefined) return { kind: "same", value: Number(number[0]) };
    const quoted = quotedText();
    if (quoted !== undefined) return { kind: "same", value: quoted };
    const word = take(/^(?:true|false|null|undefined)\b/);
    if (word !== undefined) return { kind: "same", value: words.get(word[0]) };
    return stop("a value");
  }

  function arrayAfterBracket(className: string): Expected {
    const elements: Expected[] = [];
    for (;;) {
      skipSpace();
      if (take(/^(?:\.\.\.|…)\s*\]/) !== undefined) return { kind: "array", className, elements, open: true };
      if (take(/^\]/) !== undefined) return { kind: "array", className, elements, open: false };
      elements.push(value());
      skipSpace();
      if (take(/^,|^(?=\])/) === undefined) stop("a comma or ]");
    }
  }

  function objectAfterBrace(): Expected {
    const properties: Record<string, Expected> = {};
    for (;;) {
      skipSpace();
      if (take(/^(?:\.\.\.|…)\s*\}/) !== undefined) return { kind: "object", properties, open: true };
      if (take(/^\}/) !== undefined) return { kind: "object", properties, open: false };
      const key = quotedText() ?? take(/^[\w$]+/)?.[0];
      if (key === undefined) return stop("a key");
      skipSpace();
      if (take(/^:/) === undefined) stop("a colon");
      properties[key] = value();
      skipSpace();
      if (take(/^,|^(?=\})/) === undefined) stop("a comma or }");
    }
  }

  function quotedText(): string | undefined {
    const quoted = take(/^"(?:[^"\\\n]|\\.)*"/) ?? take(/^'(?:[^'\\\n]|\\.)*'/) ?? take(/^`(?:[^`\\]|\\.)*`/);
    if (quoted === undefined) return undefined;
    const inner = quoted[0].slice(1, -1);
    return inner.replace(/\\(u[\da-f]{4}|[\s\S])/gi, (_, character: string) => {
      if (/^u[\da-f]{4}$/i.test(character)) return String.fromCharCode(Number.parseInt(character.slice(1), 16));
      return escapes.get(character) ?? character;
    });
  }

  function take(pattern: RegExp): RegExpExecArray | undefined {
    const match = pattern.exec(text.slice(position));
    if (match === null) return undefined;
    position += match[0].length;
    return match;
  }

  function skipSpace(): number {
    take(/^\s+/);
    return position;
  }

  function stop(wanted: string): never {
    throw new Error(`expected ${wanted} at "${text.slice(position, position + 30)}" of "${text}"`);
  }
}

const words = new Map<string, unknown>([
  ["true", true],
  ["false", false],
  ["null", null],
  ["undefined", undefined],
]);
const escapes = new Map([
  ["n", "\n"],
  ["t", "\t"],
]);

/** Says how a value differs from what an example shows, or undefined where it does not. */
export function differenceFrom(expected: Expected, actual: unknown, place = "the value"): string | undefined {
  const differs = (shown: unknown): string => `${place} is ${inspect(actual)}, the example shows ${inspect(shown)}`;
  switch (expected.kind) {
    case "same":
      return Object.is(expected.value, actual) ? undefined : differs(expected.value);
    case "bigint":
      return typeof actual === "bigint" && String(actual) === expected.text ? undefined : differs(`${expected.text}n`);
    case "digits":
      return typeof actual === "number" && beginsWith(actual, expected.digits) ? undefined : differs(expected.digits);
    case "array": {
      const { className, elements, open } = expected;
      const values = actual as ArrayLike<unknown> | null | undefined;
      if (typeof values !== "object" || values === null || values.constructor.name !== className)
        return differs(className);
      if (open ? values.length < elements.length : values.length !== elements.length) {
        return `${place} has ${values.length} elements, the example shows ${elements.length}`;
      }
      return firstOf(elements.map((element, index) => differenceFrom(element, values[index], `${place}[${index}]`)));
    }
    case "object": {
      if (typeof actual !== "object" || actual === null || Array.isArray(actual)) return differs("an object");
      const shown = Object.entries(expected.properties);
      const further = Object.keys(actual).find((key) => !Object.hasOwn(expected.properties, key));
      if (!expected.open && further !== undefined) return `${place} has a property ${further} that is not shown`;
      const missing = shown.find(([key]) => !Object.hasOwn(actual, key));
      if (missing !== undefined) return `${place} has no property ${missing[0]}`;
      const properties = actual as Record<string, unknown>;
      return firstOf(shown.map(([key, value]) => differenceFrom(value, properties[key], `${place}.${key}`)));
    }
  }
}

function firstOf(differences: readonly (string | undefined)[]): string | undefined {
  return differences.find((difference) => difference !== undefined);
}

function inspect(value: unknown): string {
  return typeof value === "bigint" ? `${value}n` : (JSON.stringify(value) ?? String(value));
}

/** Whether the shortest decimal of a number, cut after as many digits as are shown, is what is shown. */
function beginsWith(value: number, shown: string): boolean {
  if (!Number.isFinite(value)) return false;
  const wanted = decimalOf(shown);
  const given = decimalOf(String(value));
  if (wanted.negative !== given.negative) return false;
  const shift = given.exponent - wanted.exponent;
  const cut = shift >= 0 ? given.digits * 10n ** BigInt(shift) : given.digits / 10n ** BigInt(-shift);
  return cut === wanted.digits;
}

/** A decimal as whole digits and an exponent of ten. */
function decimalOf(text: string): { negative: boolean; digits: bigint; exponent: number } {
  const [mantissa = "", exponent = "0"] = text.replace(/^-/, "").split("e");
  const [whole = "", fraction = ""] = mantissa.split(".");
  return {
    negative: text.startsWith("-"),
    digits: BigInt(whole + fraction),
    exponent: Number(exponent) - fraction.length,
  };
}
