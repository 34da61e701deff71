// Takes what came of a start; gives it as text in the page, with the time since navigation.
// The two bench pages use it, and start.py reads it.

export function show(state: "done" | "failed", text: string): void {
  const elapsed = performance.now();
  const result = document.createElement("output");
  result.id = "result";
  result.textContent = JSON.stringify({ state, text, elapsed });
  document.body.append(result);
}
