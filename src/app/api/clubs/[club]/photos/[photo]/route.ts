import { photoQuery } from '@/features/photos/photo-schema';
import { readPicture } from '@/features/photos/read-photos';
import { clubRoute } from '@/server/doors';

export const GET = clubRoute('stands.read', {
  query: photoQuery,
  run: async ({ scope, query, params, now }) => {
    const bytes = await readPicture(scope, params.photo ?? '', query.size, now);
    return new Response(Buffer.from(bytes), {
      headers: {
        'Content-Type': 'image/jpeg',
        'Cache-Control': 'private, max-age=3600',
        'Content-Security-Policy': "default-src 'none'",
      },
    });
  },
});
