// Takes the page of one law; calculates with what is typed and keeps nothing.
// page.ts comes next.

import { Calculator } from "./calculator";
import { find } from "./dom";
import { startTerms } from "./terms";

/** The page stays as drawn, with its worked example, until something is typed or chosen. */
export function startLaw(section: HTMLElement): void {
  const decimal = find<HTMLSelectElement>(section, "#decimal");
  const around = { site: () => null, instruments: () => ({}), decimal: () => decimal.value || null };
  const calculator = new Calculator(section, around);
  let isTouched = false;
  calculator.overlay = (state) => (isTouched ? state : "example");
  calculator.takeDrawn();
  calculator.onChange = () => {
    isTouched = true;
  };
  startTerms(section, calculator);
}
