import { ROLE_LABELS } from '@bellgap/common/api';
import { Suspense, useEffect, useRef } from 'react';
import { NavLink, Outlet, ScrollRestoration, useLocation, useNavigation } from 'react-router-dom';
import { holds, maySeeDrafts, usePerson } from '../../api/session';
import { paths } from '../paths';
import { SessionGate } from '../session/session-gate';
import { useSignOut } from '../session/use-sign-out';
import { Mark } from '../../ui/mark';
import './layout.css';
import { ThemeSwitch } from './theme-switch';

function Navigation() {
  const person = usePerson();
  const entries = [
    { to: paths.desk.to(), label: 'Desk', end: true },
    { to: paths.projects.to(), label: 'Projects' },
    { to: paths.sheets.to(), label: 'Sheets' },
    { to: paths.catalogue.to(), label: 'Catalogue' },
    { to: paths.tables.to(), label: 'Tables' },
    ...(maySeeDrafts(person) ? [{ to: paths.trail.to(), label: 'Trail' }] : []),
    ...(holds(person, ['administrator']) ? [{ to: paths.administration.to(), label: 'Administration' }] : []),
  ];
  return (
    <nav className="bar-navigation" aria-label="Main">
      {entries.map(({ to, label, end }) => (
        <NavLink key={to} to={to} end={end ?? false}>
          {label}
        </NavLink>
      ))}
    </nav>
  );
}

function PersonCorner() {
  const person = usePerson();
  const signOut = useSignOut();
  const role = person.roles.map((held) => ROLE_LABELS[held].toLowerCase()).join(', ');
  return (
    <div className="bar-person">
      <ThemeSwitch />
      <NavLink to={paths.account.to()} className="bar-account" title={role ? `${person.name}, ${role}` : person.name}>
        {person.name}
        {role && <span className="bar-role">, {role}</span>}
      </NavLink>
      <button
        type="button"
        className="plain-button bar-sign-out"
        onClick={() => signOut.mutate()}
        disabled={signOut.isPending}
      >
        Sign out
      </button>
    </div>
  );
}

/** Screen readers and the keyboard begin each new page at its content. */
function useFocusOnNewPage() {
  const main = useRef<HTMLElement>(null);
  const { pathname } = useLocation();
  const shown = useRef(pathname);
  useEffect(() => {
    if (shown.current === pathname) return;
    shown.current = pathname;
    main.current?.focus({ preventScroll: true });
  }, [pathname]);
  return main;
}

/** The frame of every page for people who are signed in: a slim bar on top, no side menu. */
export function Layout() {
  const main = useFocusOnNewPage();
  const navigation = useNavigation();
  return (
    <SessionGate>
      <a className="skip-link" href="#content">
        Skip to the content
      </a>
      <header className="bar">
        <NavLink to={paths.desk.to()} className="bar-brand" aria-label="Bellgap, desk">
          <Mark />
          <span>Bellgap</span>
        </NavLink>
        <Navigation />
        <PersonCorner />
        {navigation.state === 'loading' && (
          <div className="bar-progress" role="progressbar" aria-label="Opening the page" />
        )}
      </header>
      <main id="content" ref={main} tabIndex={-1} className="content">
        <Suspense>
          <Outlet />
        </Suspense>
      </main>
      <ScrollRestoration getKey={({ pathname }) => pathname} />
    </SessionGate>
  );
}
