// Takes plain text of the engine; gives nodes in which "p_abs" is a variable with its index set low.
// result.ts comes next; generator/symbol_html.py does the same for the page as built.

import { make } from "./dom";

const INDEXED = /(?<![\p{L}\p{N}_.])(\p{L}{1,3})_([\p{L}\p{N}_]+)/gu;

export function symbolNodes(text: string): (Node | string)[] {
  const nodes: (Node | string)[] = [];
  let end = 0;
  for (const found of text.matchAll(INDEXED)) {
    const variable = make("var", found[1]);
    variable.append(make("sub", found[2]));
    nodes.push(text.slice(end, found.index), variable);
    end = found.index + found[0].length;
  }
  return [...nodes, text.slice(end)];
}
