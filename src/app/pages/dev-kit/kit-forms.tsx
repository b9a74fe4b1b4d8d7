import { Button } from "#src/components/button.tsx";
import { CheckboxField } from "#src/components/checkbox-field.tsx";
import { FormErrorSummary } from "#src/components/form-error-summary.tsx";
import { LinkButton } from "#src/components/link-button.tsx";
import { RadioGroup } from "#src/components/radio-group.tsx";
import { SelectField } from "#src/components/select-field.tsx";
import { TextArea } from "#src/components/text-area.tsx";
import { TextField } from "#src/components/text-field.tsx";

const statuses = ["Planning", "Under way", "Paused", "Finished", "Abandoned"].map((label) => ({
  value: label.toLowerCase().replace(" ", "_"),
  label,
}));

export function KitForms() {
  return (
    <div className="flex flex-col gap-8">
      <div className="flex flex-wrap gap-3">
        <Button tone="primary">Publish the entry</Button>
        <Button>Keep as a draft</Button>
        <Button tone="quiet">Look at it first</Button>
        <Button tone="destructive">Withdraw the entry</Button>
        <Button tone="primary" busy busyLabel="Publishing…">
          Publish the entry
        </Button>
        <Button disabled>Keep as a draft</Button>
        <LinkButton to="#bench">Go to the bench</LinkButton>
      </div>
      <form className="grid max-w-3xl gap-6 sm:grid-cols-2" onSubmit={(event) => event.preventDefault()}>
        <div className="sm:col-span-2">
          <FormErrorSummary
            errors={[
              { fieldId: "kit-title", message: "Give the entry a title." },
              { fieldId: "kit-height", message: "Ride height: give a figure in millimetres." },
            ]}
          />
        </div>
        <TextField id="kit-title" label="Title" error="Give the entry a title." />
        <TextField
          id="kit-height"
          label="Front ride height"
          unit="mm"
          help="Floor to the lower pivot, on the wheels."
          defaultValue="1l2"
          error="Give a figure in millimetres."
          inputMode="decimal"
        />
        <SelectField label="Status" options={statuses} defaultValue="under_way" />
        <TextField label="Donor" optional placeholder="What it came off" />
        <TextArea
          label="Reason"
          help="One sentence that would persuade you in a year."
          frameClassName="sm:col-span-2"
        />
        <RadioGroup
          legend="Who reads it"
          name="kit-visibility"
          defaultValue="public"
          options={[
            { value: "public", label: "Everyone, now" },
            { value: "supporters", label: "Supporters first", help: "Everyone else after seven days." },
            { value: "draft", label: "Only me" },
          ]}
        />
        <div>
          <CheckboxField
            label="Tell the followers by e-mail"
            defaultChecked
            help="At most one message a day."
          />
          <CheckboxField label="I have checked the numbers" error="Tick this to publish." />
        </div>
        <div className="flex gap-3 sm:col-span-2">
          <Button type="submit" tone="primary">
            Publish the entry
          </Button>
          <Button tone="quiet">Keep as a draft</Button>
        </div>
      </form>
    </div>
  );
}
