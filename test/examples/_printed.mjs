/** Values as they are printed in comments (`// => 277.82`), compared to their last printed digit. Plain JavaScript: Deno and Node run it as it is. */

/** What a printed text says: numbers keep their text, so that their digits can be counted. */
export function parsePrinted(text) {
  let at = 0;
  const space = () => {
    while (text[at] === " ") at += 1;
  };
  const take = (mark) => {
    space();
    if (!text.startsWith(mark, at)) return false;
    at += mark.length;
    return true;
  };
  const fail = () => {
    throw new Error(`cannot read the printed value "${text}" from "${text.slice(at)}" on`);
  };
  const list = (end, item) => {
    const items = [];
    while (!take(end)) {
      if (items.length > 0 && !take(",")) fail();
      if (items.length > 0 && take(end)) break;
      if (take("...")) {
        if (!take(end)) fail();
        return { items, open: true };
      }
      items.push(item());
    }
    return { items, open: false };
  };
  const value = () => {
    space();
    const rest = text.slice(at);
    const word = /^(?:true|false|null|undefined|NaN|-?Infinity)\b/.exec(rest)?.[0];
    if (word !== undefined) {
      at += word.length;
      return { kind: "word", word };
    }
    const number = /^-?(?:\d[\d_]*\.?\d*|\.\d+)(?:e[-+]?\d+)?/i.exec(rest)?.[0];
    if (number !== undefined) {
      at += number.length;
      return { kind: "number", text: number.replaceAll("_", "") };
    }
    const string = /^(?:"[^"]*"|'[^']*')/.exec(rest)?.[0];
    if (string !== undefined) {
      at += string.length;
      return { kind: "string", text: string.slice(1, -1) };
    }
    take("Float64Array");
    space();
    at += /^\(\d+\) /.exec(text.slice(at))?.[0].length ?? 0;
    if (take("[")) return { kind: "array", ...list("]", value) };
    if (take("{"))
      return {
        kind: "record",
        ...list("}", () => {
          space();
          const key = /^[\w$]+/.exec(text.slice(at))?.[0] ?? fail();
          at += key.length;
          if (!take(":")) fail();
          return { key, value: value() };
        }),
      };
    return fail();
  };
  const printed = value();
  // a unit or a remark may follow; something that looks like more value may not
  if (!/^(?:$| *$|[ ,;]+[^\s\d+\-.,[{])/.test(text.slice(at))) fail();
  return printed;
}

/** Half a unit of the last printed digit; 0.1 % of it more for a tie met from both sides. */
function tolerance(text) {
  const [digits, exponent = "0"] = text.toLowerCase().split("e");
  const decimals = (digits.split(".")[1] ?? "").length;
  return 0.5005 * 10 ** (Number(exponent) - decimals);
}

/** Undefined if `actual` is what `printed` (from parsePrinted) says, otherwise what is wrong. */
export function difference(printed, actual, where = "value") {
  const wrong = (said) => `${where} is ${show(actual)}, printed as ${said}`;
  if (printed.kind === "word")
    return String(actual) === printed.word && typeof actual !== "string"
      ? undefined
      : wrong(printed.word);
  if (printed.kind === "string")
    return actual === printed.text ? undefined : wrong(`"${printed.text}"`);
  if (printed.kind === "number") {
    if (typeof actual !== "number") return wrong(printed.text);
    return Math.abs(actual - Number(printed.text)) <= tolerance(printed.text)
      ? undefined
      : wrong(printed.text);
  }
  if (printed.kind === "array") {
    if (typeof actual?.length !== "number" || typeof actual === "string") return wrong("an array");
    const { items, open } = printed;
    if (open ? actual.length <= items.length : actual.length !== items.length)
      return `${where} has ${actual.length} elements, printed with ${items.length}${open ? " and more" : ""}`;
    return first(items.map((item, i) => difference(item, actual[i], `${where}[${i}]`)));
  }
  if (typeof actual !== "object" || actual === null) return wrong("a record");
  const keys = printed.items.map((item) => item.key);
  const missing = printed.open ? undefined : Object.keys(actual).find((key) => !keys.includes(key));
  if (missing !== undefined) return `${where} has a field ${missing} that is not printed`;
  return first(
    printed.items.map((item) => difference(item.value, actual[item.key], `${where}.${item.key}`)),
  );
}

const first = (differences) => differences.find((one) => one !== undefined);

function show(value) {
  if (typeof value === "string") return `"${value}"`;
  if (ArrayBuffer.isView(value)) return `[${Array.from(value).slice(0, 12).join(", ")}]`;
  if (typeof value !== "object" || value === null) return String(value);
  return JSON.stringify(value)?.slice(0, 200);
}
