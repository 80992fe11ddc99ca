import { serve } from '@/app/_kit/serve';
import { closeAssemblyEndpoint } from '@/lib/assemblies/endpoints';

export const POST = serve(closeAssemblyEndpoint);
