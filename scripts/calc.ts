/** `npm run -s calc -- <id> '<inputs as JSON>'`: a calculator from the command line. Without an id it lists them. */
import { calculatorIds, runCalculator } from "#shared/calculators/registry.ts";

const [id, json = "{}"] = process.argv.slice(2);

function readInputs(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}

if (id === undefined) {
  console.log(calculatorIds.join("\n"));
} else {
  const run = runCalculator(id, readInputs(json));
  console.log(JSON.stringify(run.ok ? run.value.results : { error: run.issue }, null, 2));
  process.exitCode = run.ok ? 0 : 1;
}
