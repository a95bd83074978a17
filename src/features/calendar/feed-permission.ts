import type { Permission } from '@/core/permissions';
import type { FeedScope } from './feed-schema';

export const FEED_PERMISSIONS: Record<FeedScope, Permission> = { own: 'feeds.own', club: 'feeds.club' };
