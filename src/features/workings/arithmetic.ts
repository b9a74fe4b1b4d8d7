import jsep from "jsep";

/**
 * Works a plain sum: `48.3/2`, `2*(25+3)`, `1 1/4 + 3/8`. Only numbers, + − * / and brackets are understood.
 *
 * @returns `undefined` when it is anything else or does not come to a number
 */
export function workArithmetic(text: string): number | undefined {
  const plain = text
    .replace(/[−–]/g, "-")
    .replace(/[×·]/g, "*")
    .replace(/[÷⁄]/g, "/")
    .replace(/(\d),(\d)/g, "$1.$2")
    .replace(/(\d+)\s+(\d+)\s*\/\s*(\d+)/g, "($1+$2/$3)");
  try {
    const value = worth(jsep(plain));
    return value !== undefined && Number.isFinite(value) ? value : undefined;
  } catch {
    // The parser throws at what it cannot read; to us it is simply no sum.
    return undefined;
  }
}

const operations: Readonly<Record<string, (a: number, b: number) => number>> = {
  "+": (a, b) => a + b,
  "-": (a, b) => a - b,
  "*": (a, b) => a * b,
  "/": (a, b) => a / b,
};

function worth(node: jsep.Expression): number | undefined {
  if (node.type === "Literal") return typeof node.value === "number" ? node.value : undefined;
  if (node.type === "UnaryExpression") {
    const { operator, argument } = node as jsep.UnaryExpression;
    const value = worth(argument);
    if (value === undefined) return undefined;
    return operator === "-" ? -value : operator === "+" ? value : undefined;
  }
  if (node.type !== "BinaryExpression") return undefined;
  const { operator, left, right } = node as jsep.BinaryExpression;
  const [a, b] = [worth(left), worth(right)];
  return a === undefined || b === undefined ? undefined : operations[operator]?.(a, b);
}
