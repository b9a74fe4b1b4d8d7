import { Island } from "#src/lib/island.tsx";
import { useUnits } from "#src/lib/page-settings.ts";
import { exampleWorking } from "../../working-islands.ts";

/** The saddle cope, alive on the page. */
export function LiveWorking() {
  return (
    <Island
      source={exampleWorking}
      props={{ calculator: "saddle-cope", title: "A branch at 60° on a rail", units: useUnits() }}
    />
  );
}
