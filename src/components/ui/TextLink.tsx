import clsx from 'clsx';
import { Link, type LinkProps } from 'react-router-dom';

export function TextLink({ className, ...rest }: LinkProps) {
  return (
    <Link
      className={clsx('font-medium underline underline-offset-4 hover:text-bottle', className)}
      {...rest}
    />
  );
}
