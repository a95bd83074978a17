import type { Permission } from '@/core/permissions';
import type { FeedScope } from './feed-schema';

export const FEED_PERMISSIONS: Record<FeedScope, Permission> = { own: 'feeds.own', club: 'feeds.club' };

export const FEED_NAMES: Record<FeedScope, string> = { own: 'My sits', club: "The club's sits" };
