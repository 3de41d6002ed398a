import { CheckField } from '../../components/form/CheckField.tsx';
import { DayField } from '../../components/form/DayField.tsx';
import { NoteField } from '../../components/form/NoteField.tsx';
import { QuantityField } from '../../components/form/QuantityField.tsx';
import { TextField } from '../../components/form/TextField.tsx';
import { ShapeField } from './ShapeField.tsx';

export function VesselFields() {
  return (
    <>
      <TextField name="name" label="Name" placeholder="Such as Blue bucket" autoComplete="off" />
      <ShapeField />
      <div className="grid grid-cols-2 gap-4">
        <QuantityField name="capacityL" label="Size to the brim" />
        <DayField name="cleanedOn" label="Last cleaned" />
        <QuantityField name="minC" label="Holds from" />
        <QuantityField name="maxC" label="Holds up to" />
      </div>
      <CheckField
        name="blowOff"
        label="A blow-off tube is fitted"
        hint="25 mm or more over a large or hoppy cake; an airlock blocks."
      />
      <NoteField name="notes" label="Notes" />
    </>
  );
}
