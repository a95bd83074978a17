import type { MetadataRoute } from 'next';
import { SITE_WORDS } from '@/features/accounts/words/public';

/** The paper of daylight, as in globals.css: an installed program opens before any choice of light is known. */
const PAPER = '#f4efe3';

/** Lets a phone put Windrest among its own programs. */
export default function manifest(): MetadataRoute.Manifest {
  return {
    id: '/',
    name: 'Windrest',
    short_name: 'Windrest',
    description: SITE_WORDS.description,
    start_url: '/',
    scope: '/',
    display: 'standalone',
    background_color: PAPER,
    theme_color: PAPER,
    icons: [
      { src: '/icon-192.png', sizes: '192x192', type: 'image/png' },
      { src: '/icon-512.png', sizes: '512x512', type: 'image/png' },
      { src: '/icon-maskable-512.png', sizes: '512x512', type: 'image/png', purpose: 'maskable' },
    ],
  };
}
