import { type FormEvent, useId, useState } from "react";
import { Button } from "#src/components/button.tsx";
import { Dialog } from "#src/components/dialog.tsx";
import { TextField } from "#src/components/text-field.tsx";
import { localFieldValue, momentInWords, momentOfField } from "../moments.ts";

interface ScheduleDialogProps {
  /** The time on the schedule now, if there is one. */
  scheduledAt: number | null;
  /** What the server said against the time. */
  error: string | undefined;
  busy: boolean;
  onSchedule(at: number): void;
  onClose(): void;
}

const hour = 3_600_000;

/** Asks when an entry is to be published by itself. */
export function ScheduleDialog({ scheduledAt, error, busy, onSchedule, onClose }: ScheduleDialogProps) {
  const formId = useId();
  const [value, setValue] = useState(() => localFieldValue(scheduledAt ?? nextFullHour(Date.now())));
  const [problem, setProblem] = useState("");
  const at = momentOfField(value);
  const zone = Intl.DateTimeFormat().resolvedOptions().timeZone;
  const submit = (event: FormEvent) => {
    event.preventDefault();
    if (at === null) return setProblem("Give a date and a time.");
    if (at <= Date.now()) return setProblem("That time has passed. Choose a later one, or publish now.");
    onSchedule(at);
  };
  return (
    <Dialog
      open
      onOpenChange={(stays) => !stays && onClose()}
      title="Publish later"
      description="The entry is published by itself at this time. You can change it until then."
      actions={
        <Button
          tone="primary"
          type="submit"
          form={formId}
          busy={busy}
          busyLabel="Putting it on the schedule…"
        >
          Put it on the schedule
        </Button>
      }
    >
      <form id={formId} onSubmit={submit} noValidate>
        <TextField
          type="datetime-local"
          data-focus-first=""
          label="Date and time"
          help={`In your own time (${zone}).`}
          value={value}
          error={problem || error}
          onChange={(event) => {
            setValue(event.target.value);
            setProblem("");
          }}
        />
      </form>
      <output aria-live="polite" className="text-sm">
        {at === null ? "" : momentInWords(at, Date.now())}
      </output>
    </Dialog>
  );
}

/** Tomorrow's next full hour: far enough to change one's mind, near enough to be likely. */
function nextFullHour(now: number): number {
  return Math.ceil((now + 24 * hour) / hour) * hour;
}
