import { Link, type LinkProps } from 'react-router-dom';
import { joinClassNames } from '../lib/class-names';

/** A link in running text or in a cell. */
export const TextLink = ({ className, ...rest }: LinkProps) => (
  <Link {...rest} className={joinClassNames('link-line', className)} />
);
