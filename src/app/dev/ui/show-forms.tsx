import { Button, ButtonLink, TextLink } from '@/ui/button';
import { Checkbox, CheckboxGroup, RadioCards } from '@/ui/choices';
import { CopyField } from '@/ui/copy-field';
import { FormErrorSummary, SubmitRow } from '@/ui/form';
import { Section } from '@/ui/page-parts';
import { DateInput, NumberInput, Select, Textarea, TextInput, TimeInput } from '@/ui/text-inputs';

const WEAPONS = [
  { value: 'bow', label: 'Bow' },
  { value: 'crossbow', label: 'Crossbow' },
  { value: 'muzzleloader', label: 'Muzzleloader' },
  { value: 'rifle', label: 'Rifle', disabled: true },
];

/** `tag` keeps radio groups of the three lights apart. */
export function ShowForms({ tag }: { tag: string }) {
  return (
    <>
      <Section title="Buttons">
        <div className="flex flex-wrap items-center gap-3">
          <Button look="primary">Book this sit</Button>
          <Button>Change</Button>
          <Button look="danger">Cancel sit</Button>
          <Button look="quiet">Not now</Button>
          <Button look="primary" pending pendingLabel="Booking…">
            Book this sit
          </Button>
          <Button disabled>Taken</Button>
          <ButtonLink href="/dev/ui">A link</ButtonLink>
          <TextLink href="/dev/ui">In running text</TextLink>
        </div>
      </Section>
      <Section title="A form" note="Headings hang beside the fields where there is room." heading="margin">
        <form className="grid max-w-2xl gap-5">
          <FormErrorSummary errors={[{ name: `height-${tag}`, message: 'Height must be 50 ft or less' }]} />
          <TextInput label="Stand's name" name="name" defaultValue="Heron Pond ladder" hint="As members say it." />
          <div className="grid gap-5 sm:grid-cols-2">
            <NumberInput
              label="Height of the seat"
              name={`height-${tag}`}
              unit="ft"
              defaultValue={180}
              error="Height must be 50 ft or less"
            />
            <Select
              label="Kind"
              name="kind"
              placeholder="Choose a kind"
              options={[
                { value: 'ladder', label: 'Ladder stand' },
                { value: 'box', label: 'Box blind' },
              ]}
            />
            <DateInput label="Closed from" name="from" optional />
            <TimeInput label="In by" name="in-by" defaultValue="06:05" />
          </div>
          <Textarea label="Notes" name="notes" optional placeholder="Gate code is with the steward" />
          <CheckboxGroup label="Weapons" name="weapons" choices={WEAPONS} defaultValue={['bow']} />
          <RadioCards
            label="Morning"
            name={`morning-${tag}`}
            across
            defaultValue="usable"
            choices={[
              { value: 'prime', label: 'Prime', note: 'deer come back this way' },
              { value: 'usable', label: 'Usable' },
              { value: 'avoid', label: 'Avoid', note: 'the way in crosses food' },
            ]}
          />
          <Checkbox label="Members may bring a guest" hint="The guest sits with them, not apart." />
          <CopyField
            label="Calendar address"
            value="https://club.example/feeds/abc123.ics"
            secret
            hint="Anyone who has it can read it."
          />
          <SubmitRow label="Keep the stand">
            <Button look="quiet">Leave it</Button>
          </SubmitRow>
        </form>
      </Section>
    </>
  );
}
