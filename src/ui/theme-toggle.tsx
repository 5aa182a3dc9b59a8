import { chooseTheme } from '../lib/theme.ts';
import { useTheme } from '../lib/use-theme.ts';
import { Button } from './button.tsx';

/** Says which look it turns to: dark while the page is light, light while it is dark. */
export const ThemeToggle = ({ className = '' }: { className?: string }) => {
  const theme = useTheme();
  const other = theme === 'light' ? 'dark' : 'light';
  return (
    <Button kind="quiet" slim className={className} onClick={() => chooseTheme(other)}>
      {other === 'dark' ? 'Dark' : 'Light'}
    </Button>
  );
};
