import type { Source } from '../source';
import type { Table } from '../table';

const DOOLEY: Source = {
  document: 'Dooley, Applied Science for Metal Workers',
  confidence: 'read',
  certainty: 'high',
  address: 'https://chestofbooks.com/crafts/metal/Applied-Science-Metal-Workers/458-Tempering.html',
};
const TOOL_STEEL: Source = {
  document: 'Tool steel list',
  confidence: 'read',
  certainty: 'high',
  address: 'https://doublegunshop.com/forums/ubbthreads.php?Number=100896&ubb=showthreaded',
};
const GAUGE_PLATE: Source = {
  document: 'A gauge plate maker’s chart',
  confidence: 'read',
  certainty: 'high',
  address: 'https://sheffieldgaugeplate.co.uk/blog/steel-temper-colour-chart/',
};
const STEEL_MAKER: Source = {
  document: 'A steel maker’s page',
  confidence: 'read',
  certainty: 'high',
  address: 'https://gdgwsteel.org/news/Tempering-colors.html',
};

/** Lists name the colours each in its own way; they are kept apart. */
export interface TemperColourRow {
  readonly list: 'dooley' | 'tool_steel_list' | 'gauge_plate' | 'steel_maker';
  readonly colour: string;
  /** The polished steel shows it after about an hour at this temperature. */
  readonly temperatureF: number;
}

export const TEMPER_COLOURS: Table<TemperColourRow> = {
  id: 'temper-colours',
  title: 'Oxide colours of polished carbon steel after about an hour in air',
  edition: 'Four published lists',
  rows: [
    { list: 'dooley', colour: 'very pale yellow', temperatureF: 430, source: DOOLEY },
    { list: 'dooley', colour: 'straw yellow', temperatureF: 460, source: DOOLEY },
    { list: 'dooley', colour: 'dark straw', temperatureF: 480, source: DOOLEY },
    { list: 'dooley', colour: 'brownish yellow', temperatureF: 500, source: DOOLEY },
    { list: 'dooley', colour: 'yellow tinged purple', temperatureF: 520, source: DOOLEY },
    { list: 'dooley', colour: 'light purple', temperatureF: 530, source: DOOLEY },
    { list: 'dooley', colour: 'dark purple', temperatureF: 550, source: DOOLEY },
    { list: 'dooley', colour: 'dark blue', temperatureF: 570, source: DOOLEY },
    { list: 'dooley', colour: 'pale blue', temperatureF: 610, source: DOOLEY },
    { list: 'dooley', colour: 'blue tinged green', temperatureF: 630, source: DOOLEY },
    { list: 'tool_steel_list', colour: 'faint straw', temperatureF: 390, source: TOOL_STEEL },
    { list: 'tool_steel_list', colour: 'light straw', temperatureF: 445, source: TOOL_STEEL },
    { list: 'tool_steel_list', colour: 'dark straw', temperatureF: 465, source: TOOL_STEEL },
    { list: 'tool_steel_list', colour: 'brown', temperatureF: 480, source: TOOL_STEEL },
    { list: 'tool_steel_list', colour: 'brown/purple', temperatureF: 500, source: TOOL_STEEL },
    { list: 'tool_steel_list', colour: 'purple', temperatureF: 520, source: TOOL_STEEL },
    { list: 'tool_steel_list', colour: 'dark purple', temperatureF: 540, source: TOOL_STEEL },
    { list: 'tool_steel_list', colour: 'blue', temperatureF: 575, source: TOOL_STEEL },
    { list: 'gauge_plate', colour: 'light yellow', temperatureF: 410, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'straw', temperatureF: 430, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'dark yellow', temperatureF: 460, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'yellow brown', temperatureF: 480, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'red brown', temperatureF: 500, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'purple', temperatureF: 520, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'violet', temperatureF: 530, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'dark blue', temperatureF: 550, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'wedgewood blue', temperatureF: 570, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'light blue', temperatureF: 590, source: GAUGE_PLATE },
    { list: 'gauge_plate', colour: 'grey blue', temperatureF: 610, source: GAUGE_PLATE },
    { list: 'steel_maker', colour: 'very light yellow begins', temperatureF: 350, source: STEEL_MAKER },
    { list: 'steel_maker', colour: 'light straw', temperatureF: 400, source: STEEL_MAKER },
    { list: 'steel_maker', colour: 'dark straw', temperatureF: 440, source: STEEL_MAKER },
    { list: 'steel_maker', colour: 'brown', temperatureF: 500, source: STEEL_MAKER },
    { list: 'steel_maker', colour: 'purple', temperatureF: 540, source: STEEL_MAKER },
    { list: 'steel_maker', colour: 'very deep blue', temperatureF: 590, source: STEEL_MAKER },
    { list: 'steel_maker', colour: 'lighter blue', temperatureF: 640, source: STEEL_MAKER },
  ],
};
