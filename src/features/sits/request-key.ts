export { newRequestKey } from '@/lib/request-key';
