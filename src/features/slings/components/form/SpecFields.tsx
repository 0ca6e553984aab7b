import type { ReactNode } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import type { SlingKind } from '../../../../../shared/domain/slings/kinds';
import {
  COMMON_ROPE_CLASSES,
  CONSTRUCTION_NAMES,
  CORE_NAMES,
  DUTY_NAMES,
  FERRULE_NAMES,
  FIBRE_NAMES,
  GRADE_OPTIONS,
  ROPE_GRADE_NAMES,
  ROUND_FIBRE_NAMES,
  SPLICE_NAMES,
  toOptions,
  WEB_TYPE_NAMES,
} from '../../form/options';
import type { SlingFormValues } from '../../form/values';
import { FormCheckbox, FormMeasure, FormNumber, FormSelect, FormText } from './fields';
import { FieldRow } from './FormSection';

const CHOOSE = 'Choose';

/** The fields that only this kind has. */
export function SpecFields({ kind }: { kind: SlingKind }): ReactNode {
  const Fields = FIELDS[kind];
  return <Fields />;
}

const FIELDS: Record<SlingKind, () => ReactNode> = {
  'alloy-chain': ChainFields,
  'wire-rope': WireRopeFields,
  'metal-mesh': MeshFields,
  'synthetic-web': WebFields,
  'synthetic-round': RoundFields,
  'synthetic-rope': FibreRopeFields,
};

function ChainFields(): ReactNode {
  return (
    <>
      <FieldRow>
        <FormSelect
          name="specs.alloy-chain.grade"
          label="Grade"
          hint="As marked on the links and the tag."
          placeholder={CHOOSE}
          options={GRADE_OPTIONS}
        />
        <FormMeasure
          at="specs.alloy-chain.chainMm"
          of="size"
          label="Chain size"
          hint="Nominal diameter of the link’s wire."
        />
      </FieldRow>
      <FormCheckbox
        name="specs.alloy-chain.endless"
        label="Endless"
        hint="A loop of chain without end links."
      />
    </>
  );
}

function WireRopeFields(): ReactNode {
  const { control } = useFormContext<SlingFormValues>();
  const splice = useWatch({ control, name: 'specs.wire-rope.splice' });
  const hasFerrule = splice === 'turnback' || splice === 'flemish';
  return (
    <>
      <FieldRow>
        <FormMeasure
          at="specs.wire-rope.diameterMm"
          of="size"
          label="Rope diameter"
          hint="Nominal, as the tag gives it."
        />
        <FormText
          name="specs.wire-rope.className"
          label="Rope class"
          hint={`Such as ${COMMON_ROPE_CLASSES.slice(0, 3).join(', ')}.`}
        />
        <FormSelect
          name="specs.wire-rope.construction"
          label="Construction"
          options={toOptions(CONSTRUCTION_NAMES)}
        />
        <FormSelect
          name="specs.wire-rope.core"
          label="Core"
          placeholder={CHOOSE}
          options={toOptions(CORE_NAMES)}
        />
        <FormSelect
          name="specs.wire-rope.ropeGrade"
          label="Rope grade"
          placeholder={CHOOSE}
          options={toOptions(ROPE_GRADE_NAMES)}
        />
        <FormSelect
          name="specs.wire-rope.splice"
          label="Splice or end"
          placeholder={CHOOSE}
          options={toOptions(SPLICE_NAMES)}
        />
      </FieldRow>
      {hasFerrule && (
        <FieldRow>
          <FormSelect
            name="specs.wire-rope.ferrule"
            label="Ferrule"
            optional
            placeholder="Not known"
            hint="It sets how hot the sling may get."
            options={toOptions(FERRULE_NAMES)}
          />
        </FieldRow>
      )}
    </>
  );
}

function MeshFields(): ReactNode {
  return (
    <>
      <FieldRow columns={3}>
        <FormSelect
          name="specs.metal-mesh.duty"
          label="Duty"
          placeholder={CHOOSE}
          options={toOptions(DUTY_NAMES)}
        />
        <FormMeasure at="specs.metal-mesh.widthMm" of="size" label="Width" />
        <FormMeasure at="specs.metal-mesh.wireMm" of="size" label="Wire diameter" />
      </FieldRow>
      <FormCheckbox
        name="specs.metal-mesh.coated"
        label="Coated"
        hint="Plastic or elastomer over the mesh."
      />
    </>
  );
}

function WebFields(): ReactNode {
  return (
    <FieldRow>
      <FormSelect
        name="specs.synthetic-web.type"
        label="Type"
        placeholder={CHOOSE}
        options={toOptions(WEB_TYPE_NAMES)}
      />
      <FormSelect
        name="specs.synthetic-web.fibre"
        label="Fibre"
        placeholder={CHOOSE}
        options={toOptions(FIBRE_NAMES)}
      />
      <FormMeasure
        at="specs.synthetic-web.widthMm"
        of="size"
        label="Width"
        hint="Of one layer of webbing, lying flat."
      />
      <FormNumber name="specs.synthetic-web.plies" label="Plies" hint="Layers of webbing in the body." />
    </FieldRow>
  );
}

function RoundFields(): ReactNode {
  return (
    <FieldRow>
      <FormSelect
        name="specs.synthetic-round.fibre"
        label="Core yarn"
        hint="What bears the load inside the sleeve."
        placeholder={CHOOSE}
        options={toOptions(ROUND_FIBRE_NAMES)}
      />
      <FormText
        name="specs.synthetic-round.size"
        label="Size"
        optional
        hint="The maker’s size. The sleeve’s colour never sets a rated load."
      />
    </FieldRow>
  );
}

function FibreRopeFields(): ReactNode {
  return (
    <FieldRow>
      <FormSelect
        name="specs.synthetic-rope.fibre"
        label="Fibre"
        placeholder={CHOOSE}
        options={toOptions(FIBRE_NAMES)}
      />
      <FormMeasure at="specs.synthetic-rope.diameterMm" of="size" label="Rope diameter" />
    </FieldRow>
  );
}
