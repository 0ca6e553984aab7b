import type { ReactNode } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { RadioTiles } from '../../../../components/ui/Tiles';
import { useLocations, useSites } from '../../../../lib/places';
import { SERVICE_CLASS_NAMES, toOptions } from '../../form/options';
import type { SlingFormValues } from '../../form/values';
import { FormDate, FormSelect, FormText } from './fields';
import { FieldRow, FormSection } from './FormSection';

const CLASS_OPTIONS = toOptions(SERVICE_CLASS_NAMES);
const OWNER_TILES = [
  { value: 'own', label: 'Own' },
  { value: 'hired', label: 'Hired' },
];

/** Where the sling belongs, to whom, and how hard its service is. */
export function PlaceSection({ today }: { today: string }): ReactNode {
  const { control, register } = useFormContext<SlingFormValues>();
  const [siteId, ownerKind] = useWatch({ control, name: ['siteId', 'owner.kind'] });
  const sites = useSites().data?.items ?? [];
  const locations = useLocations().data?.items ?? [];
  const homes = locations.filter(
    (location) =>
      String(location.siteId) === siteId && location.purpose !== 'cage' && location.purpose !== 'look_over',
  );
  return (
    <FormSection
      title="Place and owner"
      about="Severe and special service is inspected more often than normal service."
    >
      <FieldRow columns={3}>
        <FormSelect
          name="siteId"
          label="Site"
          placeholder="Choose a site"
          options={sites.map(({ id, name }) => ({ value: String(id), label: name }))}
        />
        <FormSelect
          name="homeLocationId"
          label="Home location"
          optional
          placeholder={siteId ? 'None yet' : 'Choose the site first'}
          options={homes.map(({ id, name }) => ({ value: String(id), label: name }))}
        />
        <FormSelect name="serviceClass" label="Service class" options={CLASS_OPTIONS} />
      </FieldRow>
      <RadioTiles legend="Owner" options={OWNER_TILES} input={register('owner.kind')} />
      {ownerKind === 'hired' && (
        <FieldRow>
          <FormText name="owner.name" label="Hired from" hint="The company that owns it." />
          <FormDate
            name="owner.offHireOn"
            label="Off hire on"
            optional
            min={today}
            hint="From that day on it is not used."
          />
        </FieldRow>
      )}
    </FormSection>
  );
}
