import { serve } from '@/app/_kit/serve';
import { createAssemblyEndpoint, listAssembliesEndpoint } from '@/lib/assemblies/endpoints';

export const GET = serve(listAssembliesEndpoint);
export const POST = serve(createAssemblyEndpoint);
