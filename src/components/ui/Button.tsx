import type { ComponentProps } from 'react';
import { buttonClass, type ButtonLook, type ButtonSize } from './buttonClass.ts';

export interface ButtonProps extends ComponentProps<'button'> {
  look?: ButtonLook;
  size?: ButtonSize;
}

export function Button({ look, size, className, type = 'button', ...rest }: ButtonProps) {
  return <button type={type} className={buttonClass(look, size, className)} {...rest} />;
}
