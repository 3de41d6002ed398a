import { PickerField, type PickerFieldProps } from './PickerField.tsx';

const TIME = {
  type: 'datetime-local',
  min: '1900-01-01T00:00',
  max: '2199-12-31T23:59',
} as const;

/** A day and a time on the brewery's clock. */
export const TimeField = (props: PickerFieldProps) => <PickerField {...props} picker={TIME} />;
