import { Link, type LinkProps } from 'react-router-dom';
import { buttonClass, type ButtonLook, type ButtonSize } from './buttonClass.ts';

export interface LinkButtonProps extends LinkProps {
  look?: ButtonLook;
  size?: ButtonSize;
}

export function LinkButton({ look, size, className, ...rest }: LinkButtonProps) {
  return <Link className={buttonClass(look, size, className)} {...rest} />;
}
