import { Menu } from '@/ui/menu';
import { CLUB_SWITCH_WORDS } from '../words/club';

interface ClubSwitchProps {
  name: string;
  slug: string;
  clubs: { slug: string; name: string }[];
}

/** The club's name, and for a person of several clubs the way to the others. */
export function ClubSwitch({ name, slug, clubs }: ClubSwitchProps) {
  if (clubs.length < 2) return <p className="truncate font-semibold">{name}</p>;
  return (
    <Menu
      label={<span className="truncate">{name}</span>}
      name={CLUB_SWITCH_WORDS.change(name)}
      look="quiet"
      className="max-w-full min-w-0"
      items={clubs.map((club) => ({
        label: club.name,
        href: `/clubs/${club.slug}`,
        current: club.slug === slug,
      }))}
    />
  );
}
