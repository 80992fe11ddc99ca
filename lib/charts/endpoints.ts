import { endpoint } from '@/lib/api/endpoint';

import * as contract from './contract';
import { getChart } from './get-chart';
import { judgeChart } from './judge-chart';

export const getChartEndpoint = endpoint(contract.getChart, getChart);
export const judgeChartEndpoint = endpoint(contract.judgeChart, judgeChart);
