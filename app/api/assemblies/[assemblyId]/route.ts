import { serve } from '@/app/_kit/serve';
import { getAssemblyEndpoint, updateAssemblyEndpoint } from '@/lib/assemblies/endpoints';

export const GET = serve(getAssemblyEndpoint);
export const PUT = serve(updateAssemblyEndpoint);
