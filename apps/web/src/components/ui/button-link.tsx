import { Link } from 'react-router-dom';
import type { LinkProps } from 'react-router-dom';
import { buttonStyle } from './button-style.ts';
import type { ButtonKind } from './button-style.ts';
import { classNames } from './class-names.ts';

/** A link to another screen that looks like a button. */
export function ButtonLink({
  kind,
  small,
  className,
  ...rest
}: LinkProps & { kind?: ButtonKind; small?: boolean }) {
  return <Link {...rest} className={classNames(buttonStyle(kind, small), className)} />;
}
