import { endpoint } from '@/lib/api/endpoint';

import { closeAssembly, createAssembly, updateAssembly } from './change-assembly';
import * as contract from './contract';
import { getAssembly, listAssemblies } from './queries';

export const listAssembliesEndpoint = endpoint(contract.listAssemblies, listAssemblies);
export const getAssemblyEndpoint = endpoint(contract.getAssembly, getAssembly);
export const createAssemblyEndpoint = endpoint(contract.createAssembly, createAssembly);
export const updateAssemblyEndpoint = endpoint(contract.updateAssembly, updateAssembly);
export const closeAssemblyEndpoint = endpoint(contract.closeAssembly, closeAssembly);
