import { answerReady } from '@/app/_kit/ready';

/** Whether all that is needed answers: database, storage, mail, queue. */
export const GET = (): Promise<Response> => answerReady();
