'use client';

import { FieldGroup } from '@/ui/field';
import { Section } from '@/ui/page-parts';
import { NumberInput, Select, TimeInput } from '@/ui/text-inputs';
import { useRulesFields } from './use-rules-fields';

const sides = (event: string) => [
  { value: 'before', label: `before ${event}` },
  { value: 'after', label: `after ${event}` },
];

export function RulesHours() {
  const field = useRulesFields();
  return (
    <Section
      title="Window hours"
      note="When a morning and an evening begin and end for booking and the board. Sits already booked keep their hours."
    >
      <div className="grid gap-6 sm:grid-cols-2">
        <FieldGroup label="Morning">
          <div className="flex flex-col gap-3">
            <div className="grid grid-cols-2 items-end gap-3">
              <NumberInput label="Starts, minutes" step="1" {...field('morningStart.minutes')} />
              <Select label="Side of sunrise" options={sides('sunrise')} {...field('morningStart.side')} />
            </div>
            <TimeInput label="Ends at" {...field('morningEnd')} />
          </div>
        </FieldGroup>
        <FieldGroup label="Evening">
          <div className="flex flex-col gap-3">
            <TimeInput label="Starts at" {...field('eveningStart')} />
            <div className="grid grid-cols-2 items-end gap-3">
              <NumberInput label="Ends, minutes" step="1" {...field('eveningEnd.minutes')} />
              <Select label="Side of sunset" options={sides('sunset')} {...field('eveningEnd.side')} />
            </div>
          </div>
        </FieldGroup>
      </div>
    </Section>
  );
}
