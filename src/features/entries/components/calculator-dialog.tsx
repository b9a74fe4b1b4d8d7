import { calculators } from "#shared/calculators/registry.ts";
import { Dialog } from "#src/components/dialog.tsx";

interface CalculatorDialogProps {
  onClose(): void;
  onChoose(choice: { calculator: string; title: string; inputs: Record<string, unknown> }): void;
}

/** Asks which calculator a new working is of; it starts from the calculator's own example. */
export function CalculatorDialog({ onClose, onChoose }: CalculatorDialogProps) {
  return (
    <Dialog
      open
      onOpenChange={(stays) => !stays && onClose()}
      title="Put in a working"
      description="Choose the calculator. It starts with the numbers of an example: put in your own."
    >
      <ul className="flex flex-col gap-2">
        {calculators.map(({ id, name, purpose, group, example }, index) => (
          <li key={id}>
            <button
              type="button"
              data-focus-first={index === 0 ? "" : undefined}
              onClick={() => onChoose({ calculator: id, title: "", inputs: { ...example } })}
              className="w-full cursor-pointer rounded border border-edge bg-paper px-4 py-3 text-left hover:bg-temper-wash"
            >
              <span className="block text-xs text-ink-soft">{group}</span>
              <span className="block font-semibold">{name}</span>
              <span className="mt-0.5 block text-sm text-ink-soft">{purpose}</span>
            </button>
          </li>
        ))}
      </ul>
    </Dialog>
  );
}
