import { PickerField, type PickerFieldProps } from './PickerField.tsx';

const DAY = { type: 'date', min: '1900-01-01', max: '2199-12-31' } as const;

/** A calendar day. */
export const DayField = (props: PickerFieldProps) => <PickerField {...props} picker={DAY} />;
