import { Link, NavLink } from 'react-router-dom';

import { ThemeToggle } from '../ui/theme-toggle.tsx';
import { Wordmark } from '../ui/wordmark.tsx';
import { paths } from './paths.ts';

const place =
  'py-1 text-slate aria-[current=page]:font-semibold aria-[current=page]:text-ink hover:text-ink';

/** The way about between the places that work; those of an account only for who is signed in. */
export const PlaceHeader = ({ signedIn }: { signedIn: boolean }) => (
  <header className="flex shrink-0 flex-wrap items-center gap-x-5 gap-y-1 border-b border-rule px-4 py-2 sm:px-8">
    <Link to={paths.landing} aria-label="Ellwand, to the front page">
      <Wordmark compact={signedIn} />
    </Link>
    <nav aria-label="Places" className="flex flex-wrap gap-x-5">
      {signedIn && (
        <NavLink to={paths.gowns} className={place}>
          Gowns
        </NavLink>
      )}
      {signedIn && (
        <NavLink to={paths.clients} className={place}>
          Clients
        </NavLink>
      )}
      <NavLink to={paths.compare} className={place}>
        Compare
      </NavLink>
      {signedIn && (
        <NavLink to={paths.classes} className={place}>
          Classes
        </NavLink>
      )}
    </nav>
    <div className="ml-auto flex items-center gap-3">
      {signedIn ? (
        <NavLink to={paths.account} className={place}>
          Account
        </NavLink>
      ) : (
        <NavLink to={paths.signIn} className={place}>
          Sign in
        </NavLink>
      )}
      <ThemeToggle />
    </div>
  </header>
);
