import { NavLink } from 'react-router-dom';

const places = [
  { to: '/gowns', label: 'Gowns' },
  { to: '/gowns/measure-cards', label: 'Measure cards' },
] as const;

/** From the gowns to the measure cards they are drawn from, and back. */
export const ListTabs = () => (
  <nav aria-label="Gowns and measure cards" className="flex gap-6">
    {places.map(({ to, label }) => (
      <NavLink
        key={to}
        to={to}
        end
        className="-mb-px border-b-2 border-transparent py-2 text-slate aria-[current=page]:border-brass aria-[current=page]:font-semibold aria-[current=page]:text-ink"
      >
        {label}
      </NavLink>
    ))}
  </nav>
);
