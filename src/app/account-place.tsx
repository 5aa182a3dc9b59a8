import { useNavigate } from 'react-router-dom';

import { AccountPage } from '../features/account/routes/account-page.tsx';
import { paths } from './paths.ts';

/** The account; who leaves it stands at the front page again. */
export const AccountPlace = () => {
  const navigate = useNavigate();
  return <AccountPage onLeft={() => void navigate(paths.landing)} />;
};
