import { Link } from 'react-router-dom';

import { signedInHint } from '../../../lib/signed-in-hint.ts';
import { ThemeToggle } from '../../../ui/theme-toggle.tsx';
import { Wordmark } from '../../../ui/wordmark.tsx';
import { DemoDrawing } from '../components/demo-drawing.tsx';

const promises = [
  {
    title: 'Ten measures',
    words:
      'Type them as you read them off the tape, in inches or centimetres. What you did not take is estimated, and says so.',
  },
  {
    title: 'Proven pieces',
    words:
      'Every draft walks its own seams and counts its own girths. One sentence says whether the pieces sew together.',
  },
  {
    title: 'Paper tonight',
    words:
      'A chalk sheet on one page, a bodice toile on a few, or the whole gown at true scale on home paper.',
  },
] as const;

/** What Ellwand does, in a few words and one drawing. */
export const LandingPage = () => (
  <div className="flex min-h-dvh flex-col">
    <title>Ellwand · gowns to measure</title>
    <header className="flex items-center justify-between border-b border-rule px-4 py-2 sm:px-8">
      <Wordmark />
      <span className="flex items-center gap-2">
        {signedInHint() ? (
          <Link to="/gowns" className="px-2 font-semibold text-brass">
            Gowns
          </Link>
        ) : (
          <Link to="/sign-in" className="px-2 text-brass">
            Sign in
          </Link>
        )}
        <ThemeToggle className="-mr-4" />
      </span>
    </header>
    <main id="content" className="mx-auto w-full max-w-[86rem] grow px-4 sm:px-8">
      <div className="grid items-center gap-8 py-8 md:grid-cols-[minmax(0,5fr)_minmax(0,7fr)] md:gap-12 md:py-16">
        <div>
          <h1 className="text-4xl leading-[1.1] font-semibold text-balance sm:text-5xl">
            A gown to her measure, proven before you cut
          </h1>
          <p className="mt-4 max-w-[34em] text-lg">
            Ellwand is a workroom for people who make gowns to measure. A measure card and a style
            card become front and back pieces that are proven to sew together, and print at true
            scale.
          </p>
          <p className="mt-6 flex flex-wrap items-center gap-x-6 gap-y-3">
            <Link
              to="/try"
              className="inline-flex min-h-12 items-center rounded-one bg-brass px-6 text-lg font-semibold text-on-brass"
            >
              Try it
            </Link>
            <span className="text-slate">
              No account needed. Your figures stay in this browser until you keep them.
            </span>
          </p>
        </div>
        <DemoDrawing />
      </div>
      <ul className="grid gap-x-12 gap-y-6 border-t border-rule py-8 md:grid-cols-3">
        {promises.map(({ title, words }) => (
          <li key={title}>
            <h2 className="text-lg font-semibold">{title}</h2>
            <p className="text-slate">{words}</p>
          </li>
        ))}
      </ul>
    </main>
  </div>
);
