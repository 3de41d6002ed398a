import { CheckField } from '../../../components/form/CheckField.tsx';
import { DayField } from '../../../components/form/DayField.tsx';
import { TextField } from '../../../components/form/TextField.tsx';

/** What is chosen of a link, when it is made and later. */
export function ShareLinkFields() {
  return (
    <>
      <TextField
        name="name"
        label="Whom or what it is for"
        autoComplete="off"
        hint="For your own list; it is not shown to them."
      />
      <DayField name="expiresOn" label="Works until" />
      <CheckField name="showPrices" label="Show what the yeast costs" />
    </>
  );
}
