import { paths } from '../paths';
import { TextLink } from '../ui/text-link';
import { Page } from './page';

/** An address that leads nowhere. */
export const NotFound = () => (
  <Page title="There is nothing at this address">
    <p className="max-w-[38rem]">
      The link may be old, or what it led to is not open to your role. Nothing was changed.{' '}
      <TextLink to={paths.home}>Go to your own place</TextLink>.
    </p>
  </Page>
);
