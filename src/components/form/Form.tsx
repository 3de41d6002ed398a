import { useState, type ReactNode } from 'react';
import { FormProvider, type FieldValues, type UseFormReturn } from 'react-hook-form';
import { reportClientError } from '../../api/clientErrors.ts';
import { FormFoot } from './FormFoot.tsx';
import { showServerErrors } from './serverErrors.ts';

export interface FormProps<V extends FieldValues, C, O extends FieldValues> {
  form: UseFormReturn<V, C, O>;
  /** Saves. What it throws is shown in the form; what was typed stays. */
  onSubmit: (values: O) => Promise<void>;
  children: ReactNode;
  /** The word on the first button. */
  action: string;
  /** While it is at work: "Saving". */
  busyAction?: string;
  onCancel?: () => void;
  /** Wide button, as on the sign-in page. */
  wide?: boolean;
  /** Beside the buttons, such as a delete. */
  aside?: ReactNode;
}

export function Form<V extends FieldValues, C, O extends FieldValues>(props: FormProps<V, C, O>) {
  const { form, onSubmit, children } = props;
  const [failure, setFailure] = useState<string | null>(null);
  const submit = form.handleSubmit(async (values) => {
    setFailure(null);
    try {
      await onSubmit(values);
    } catch (error) {
      reportClientError(error, location.pathname);
      setFailure(showServerErrors(form, error));
    }
  });
  return (
    <FormProvider {...form}>
      <form noValidate onSubmit={submit} className="space-y-5">
        {children}
        <FormFoot {...props} failure={failure} busy={form.formState.isSubmitting} />
      </form>
    </FormProvider>
  );
}
