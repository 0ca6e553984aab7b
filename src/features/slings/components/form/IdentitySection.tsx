import type { ReactNode } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { KIND_FACTS } from '../../../../../shared/domain/slings/kinds';
import { MAKERS_TAG_NAMES, toOptions } from '../../form/options';
import type { SlingFormValues } from '../../form/values';
import { FormDate, FormSelect, FormText } from './fields';
import { FieldRow, FormSection } from './FormSection';

const TAG_OPTIONS = toOptions(MAKERS_TAG_NAMES);

/** What tells this sling from every other: the company's number and what stands on the maker's tag. */
export function IdentitySection({ today }: { today: string }): ReactNode {
  const { control } = useFormContext<SlingFormValues>();
  const [kind, receivedOn, makersTag] = useWatch({ control, name: ['kind', 'receivedOn', 'makersTag'] });
  const isSerialNeeded = kind !== '' && KIND_FACTS[kind].needsMakerSerial;
  return (
    <FormSection title="Identity" about="From the sling and its maker’s tag, as it stands there.">
      <FieldRow>
        <FormText name="number" label="Number" hint="Your company’s own number for it." />
        <FormText name="maker" label="Maker" hint="The name on the maker’s tag." />
        <FormText
          name="makerSerial"
          label="Maker’s serial"
          optional={!isSerialNeeded}
          hint={isSerialNeeded ? 'The tag of this kind carries one.' : 'Where the tag carries one.'}
        />
        <FormText
          name="stockNumber"
          label="Stock number"
          optional={isSerialNeeded}
          hint={isSerialNeeded ? 'The maker’s article number.' : 'Needed where there is no serial.'}
        />
        <FormText name="lot" label="Lot or batch" optional hint="A maker’s notice often names it." />
        <FormSelect
          name="makersTag"
          label="Maker’s tag"
          options={TAG_OPTIONS}
          hint={
            makersTag === 'legible'
              ? 'As you see it on the sling.'
              : 'It can be registered, but is not accepted without a legible tag.'
          }
        />
      </FieldRow>
      <FieldRow columns={3}>
        <FormDate name="madeOn" label="Made on" optional max={receivedOn || today} />
        <FormDate name="receivedOn" label="Received on" max={today} />
        <FormDate name="firstUseOn" label="First used on" optional max={today} />
      </FieldRow>
    </FormSection>
  );
}
