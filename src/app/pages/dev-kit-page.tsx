import type { ReactNode } from "react";
import { PageHeading } from "#src/components/page-heading.tsx";
import { KitEntry } from "./dev-kit/kit-entry.tsx";
import { KitForms } from "./dev-kit/kit-forms.tsx";
import { KitOverlays } from "./dev-kit/kit-overlays.tsx";
import { KitPlate } from "./dev-kit/kit-plate.tsx";
import { KitRule } from "./dev-kit/kit-rule.tsx";
import { KitStates } from "./dev-kit/kit-states.tsx";
import { KitType } from "./dev-kit/kit-type.tsx";

/** Every part of the kit in its states, for whoever changes one of them. */
export function Component() {
  return (
    <div className="page-width py-10">
      <PageHeading
        title="The kit"
        purpose="Every part of the interface in its states. Look here before drawing a new one."
      />
      <div className="flex flex-col gap-16">
        <KitSection title="Type and colour">
          <KitType />
        </KitSection>
        <KitSection title="The rule">
          <KitRule />
        </KitSection>
        <KitSection title="An entry and its margin">
          <KitEntry />
        </KitSection>
        <KitSection title="Plate">
          <KitPlate />
        </KitSection>
        <KitSection title="Buttons and forms">
          <KitForms />
        </KitSection>
        <KitSection title="Messages and states">
          <KitStates />
        </KitSection>
        <KitSection title="Menus, dialogs, tabs, order">
          <KitOverlays />
        </KitSection>
      </div>
    </div>
  );
}

function KitSection({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section>
      <h2 className="mb-5">{title}</h2>
      {children}
    </section>
  );
}
