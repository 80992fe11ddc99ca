import { handlers } from '@/app/_kit/auth';

export const { GET, POST } = handlers;
