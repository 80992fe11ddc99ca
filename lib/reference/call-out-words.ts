import type { CallOutNote } from '@/lib/trade/lineage/call-out-findings';

/** What a call-out silently means, in a sentence; the same on the bench, in the editor and in the checks. */
export const CALL_OUT_WORDS: Record<CallOutNote, string> = {
  type_i_hexavalent_applies: 'No type is said, so Type I applies, with hexavalent chromium.',
  nitric_unless_engineering_allows_citric: 'Nitric acid applies unless engineering allows citric.',
  acceptance_class_4_applies: 'Acceptance class 4 applies.',
  type_guidance_lost:
    'The later document does not say which type goes with which steel: engineering has to say.',
  excludes_parts: 'By its scope it is not for parts: engineering has to say what is.',
  raw_material_only: 'It is for raw material, not for parts: engineering has to say what is.',
  pulls_in_slash_sheet: 'The slash sheet for the steel applies with it.',
  number_forks_by_product: 'Its number became several, by product: say which.',
  classes_do_not_map: 'Its classes do not carry over to its successor: engineering has to say.',
  not_over_200_ksi_unless_specified: 'It is not for steel over 200 ksi unless the order says so.',
  no_sensitivity_level_in_first_issue: 'Its first issue has no sensitivity levels.',
};
