import { serve } from '@/app/_kit/serve';
import { listMessagesEndpoint, writeToProcessorEndpoint } from '@/lib/messages/endpoints';

export const GET = serve(listMessagesEndpoint);
export const POST = serve(writeToProcessorEndpoint);
