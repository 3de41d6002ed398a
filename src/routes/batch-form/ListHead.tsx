import { useFormContext, useWatch } from 'react-hook-form';
import { SegmentedField } from '../../components/form/SegmentedField.tsx';

export interface ListHeadProps {
  name: 'dryHopsKnown' | 'additionsKnown';
  label: string;
  onSome: () => void;
}

const OPTIONS = [
  { value: 'none', label: 'None' },
  { value: 'some', label: 'These' },
  { value: 'unknown', label: 'Not known yet' },
];

/** None, these, or not known: an empty list and an unknown one are not the same to the checks. */
export function ListHead({ name, label, onSome }: ListHeadProps) {
  return (
    <SegmentedField
      name={name}
      label={label}
      options={OPTIONS}
      onPicked={(value) => {
        if (value === 'some') onSome();
      }}
    />
  );
}

export function useKnown(name: ListHeadProps['name']) {
  const { control } = useFormContext();
  return useWatch({ control, name }) === 'some';
}
