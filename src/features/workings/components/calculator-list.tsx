import { Link } from "react-router";
import { paths } from "#src/lib/paths.ts";

export interface ListedCalculator {
  id: string;
  name: string;
  purpose: string;
  group: string;
}

/** Calculators under the heading of what a person is doing. */
export function CalculatorList({ calculators }: { calculators: readonly ListedCalculator[] }) {
  const groups = [...new Set(calculators.map(({ group }) => group))];
  return groups.map((group) => (
    <section key={group} aria-label={group} className="mb-10">
      <h2 className="mb-3 text-lg">{group}</h2>
      <ul className="grid gap-x-6 gap-y-3 sm:grid-cols-2 lg:grid-cols-3">
        {calculators
          .filter((calculator) => calculator.group === group)
          .map((calculator) => (
            <li key={calculator.id} className="flex">
              <Link
                to={paths.calculator(calculator.id)}
                className="plate block flex-1 px-4 py-3 text-chalk! no-underline! hover:border-chalk-soft!"
              >
                <span className="block font-semibold">{calculator.name}</span>
                <span className="mt-1 block text-xs text-chalk-soft">{calculator.purpose}</span>
              </Link>
            </li>
          ))}
      </ul>
    </section>
  ));
}
