import type { BritishMaterialRow } from '../lineage/british-material';
import type { Source } from '../source';
import type { Table } from '../table';

const RECALLED: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'medium',
};

const RESTORERS_FORUM: Source = {
  document: 'Restorers on clad sheet; cladding and condition from memory',
  confidence: 'read+memory',
  certainty: 'medium',
  address: 'https://keypublishing.wordpress-developer.us/topic/spit-aluminum',
};

const RECALLED_WEAKLY: Source = {
  document: 'General knowledge of the trade',
  confidence: 'memory',
  certainty: 'low',
};

const BS_L109_PAGE: Source = {
  document: 'BS L109:1971',
  confidence: 'read',
  certainty: 'high',
  address: 'https://standards.biao-zhun.cn/bs-l-109-1971-pdf-download.html',
};

const DTD_5014A_COVER: Source = {
  document: 'DTD 5014A, June 1971; class from memory',
  confidence: 'read+memory',
  certainty: 'medium',
  address: 'https://id.scribd.com/document/261004457/dtd5014a',
};

const SPAR_FORUM: Source = {
  document: 'Historic aviation forum on wing spars',
  confidence: 'read',
  certainty: 'medium',
  address: 'https://forum.keypublishing.com/forum/historic-aviation/3838421-hawker-hind-type-wing-spars',
};

const TUBE_FORUM: Source = {
  document: 'Light aircraft forum on T45; composition from memory',
  confidence: 'read+memory',
  certainty: 'medium',
  address: 'https://phpbb.lightaircraftassociation.co.uk/viewtopic.php?f=4&t=3088',
};

const SHEET_FORUM: Source = {
  document: 'Light aircraft forum on S514',
  confidence: 'read',
  certainty: 'medium',
  address: 'https://phpbb.lightaircraftassociation.co.uk/viewtopic.php?f=4&t=3088',
};

/** British numbers of the past and what is nearest to them. Nothing here is an equivalence; engineering decides. */
export const BRITISH_MATERIALS: Table<BritishMaterialRow> = {
  id: 'british-materials',
  title: 'British aircraft material numbers',
  edition: 'Collected from covers, pages and forums, 2026',
  rows: [
    {
      number: 'BS L3',
      material: 'Al-Cu-Mg-Mn sheet, duralumin type',
      clad: false,
      condition: 'solution treated, naturally aged',
      supersededBy: [],
      nearest: '2017-T4 class',
      source: RECALLED,
    },
    {
      number: 'BS L38',
      material: 'Clad sheet, duralumin type',
      clad: true,
      condition: 'solution treated',
      supersededBy: [],
      nearest: 'clad 2017 or 2014',
      source: RECALLED,
    },
    {
      number: 'DTD 390',
      material: 'Clad sheet, duralumin type',
      clad: true,
      condition: 'solution treated, naturally aged',
      supersededBy: ['BS L163'],
      nearest: null,
      source: RESTORERS_FORUM,
    },
    {
      number: 'DTD 546',
      material: 'Clad Al-Cu-Mg-Si-Mn sheet',
      clad: true,
      condition: 'solution and precipitation treated',
      supersededBy: ['BS L73', 'BS L165'],
      nearest: 'clad 2014A-T6',
      source: RECALLED,
    },
    {
      number: 'DTD 603',
      material: 'Al-Cu-Mg-Si-Mn sheet',
      clad: false,
      condition: 'solution treated',
      supersededBy: ['BS L70'],
      nearest: null,
      source: RECALLED,
    },
    {
      number: 'DTD 610',
      material: 'Clad Al-Cu-Mg-Si-Mn sheet',
      clad: true,
      condition: 'solution treated',
      supersededBy: ['BS L72', 'BS L163', 'BS L164'],
      nearest: 'clad 2014A-T3 or T4',
      source: RECALLED,
    },
    {
      number: 'DTD 646',
      material: 'Al-Cu-Mg-Si-Mn sheet',
      clad: false,
      condition: 'solution and precipitation treated',
      supersededBy: ['BS L71'],
      nearest: null,
      source: RECALLED,
    },
    {
      number: 'DTD 687',
      material: 'Clad Al-Zn-Mg-Cu sheet',
      clad: true,
      condition: 'solution and precipitation treated',
      supersededBy: ['BS L88'],
      nearest: 'clad 7075-T6',
      source: RECALLED,
    },
    {
      number: 'BS L70',
      material: 'Al-Cu-Mg-Si-Mn sheet',
      clad: false,
      condition: 'solution treated, naturally aged',
      supersededBy: ['BS L156', 'BS L157', 'BS L158'],
      nearest: '2014A-T4',
      source: RECALLED,
    },
    {
      number: 'BS L71',
      material: 'Al-Cu-Mg-Si-Mn sheet',
      clad: false,
      condition: 'precipitation treated',
      supersededBy: ['BS L159'],
      nearest: '2014A-T6',
      source: RECALLED,
    },
    {
      number: 'BS L72',
      material: 'Clad Al-Cu-Mg-Si-Mn sheet',
      clad: true,
      condition: 'solution treated, naturally aged',
      supersededBy: ['BS L163', 'BS L164'],
      nearest: 'clad 2014A-T3 or T4',
      source: RECALLED,
    },
    {
      number: 'BS L73',
      material: 'Clad Al-Cu-Mg-Si-Mn sheet',
      clad: true,
      condition: 'precipitation treated',
      supersededBy: ['BS L165'],
      nearest: 'clad 2014A-T6',
      source: RECALLED,
    },
    {
      number: 'BS L88',
      material: 'Clad Al-Zn-Mg-Cu sheet',
      clad: true,
      condition: 'precipitation treated',
      supersededBy: [],
      nearest: 'clad 7075-T6',
      source: RECALLED,
    },
    {
      number: 'BS L89',
      material: null,
      clad: null,
      condition: null,
      supersededBy: [],
      nearest: null,
      source: RECALLED_WEAKLY,
    },
    {
      number: 'BS L163',
      material: 'Clad Al-Cu-Mg-Si-Mn sheet',
      clad: true,
      condition: 'solution treated, cold worked, naturally aged',
      supersededBy: [],
      nearest: 'clad 2014A-T3',
      source: RESTORERS_FORUM,
    },
    {
      number: 'BS L109',
      material: 'Clad sheet, core like 2024',
      clad: true,
      condition: 'solution treated, straightened, naturally aged',
      supersededBy: [],
      nearest: 'clad 2024-T3 or T4',
      source: BS_L109_PAGE,
    },
    {
      number: 'BS L110',
      material: 'Clad sheet, core like 2024',
      clad: true,
      condition: 'as rolled, for solution treatment by the user',
      supersededBy: [],
      nearest: 'clad 2024-F or O',
      source: BS_L109_PAGE,
    },
    {
      number: 'BS L97',
      material: '2024 type plate',
      clad: false,
      condition: 'stretched, naturally aged',
      supersededBy: [],
      nearest: '2024-T351',
      source: BS_L109_PAGE,
    },
    {
      number: 'BS L98',
      material: '2024 type plate',
      clad: false,
      condition: 'naturally aged',
      supersededBy: [],
      nearest: '2024-T4',
      source: BS_L109_PAGE,
    },
    {
      number: 'DTD 5014',
      material: 'Al-Cu-Mg-Ni-Fe bar and extrusion',
      clad: false,
      condition: 'solution and precipitation treated',
      supersededBy: [],
      nearest: '2618A class',
      source: DTD_5014A_COVER,
    },
    {
      number: 'DTD 54',
      material: 'Nickel-chromium steel sheet for rolled spars, SAE 3315 type',
      clad: false,
      condition: 'hardened',
      supersededBy: ['BS S88'],
      nearest: null,
      source: SPAR_FORUM,
    },
    {
      number: 'BS S88',
      material: 'Nickel-chromium steel sheet for rolled spars',
      clad: false,
      condition: 'hardened',
      supersededBy: [],
      nearest: null,
      source: SPAR_FORUM,
    },
    {
      number: 'BS T45',
      material: 'Structural carbon-manganese steel tube',
      clad: false,
      condition: null,
      supersededBy: [],
      nearest: null,
      source: TUBE_FORUM,
    },
    {
      number: 'BS S514',
      material: 'Steel sheet used beside T45 tube',
      clad: false,
      condition: null,
      supersededBy: [],
      nearest: null,
      source: SHEET_FORUM,
    },
  ],
};
