/** The ids and the error of one field; the control points to both by `aria-describedby`. */
export interface FieldState {
  id: string;
  errorId: string;
  hintId: string;
  message: string | undefined;
  /** For the control itself. */
  aria: { 'aria-invalid': boolean; 'aria-describedby': string | undefined };
}

export function fieldState(own: string, message: string | undefined, hasHint: boolean): FieldState {
  const errorId = `${own}-error`;
  const hintId = `${own}-hint`;
  const described = [message && errorId, hasHint && hintId].filter(Boolean).join(' ');
  return {
    id: `${own}-field`,
    errorId,
    hintId,
    message,
    aria: { 'aria-invalid': message !== undefined, 'aria-describedby': described || undefined },
  };
}
