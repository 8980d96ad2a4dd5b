/**
 * Error names with their status and kind, as the service publishes them.
 * Source: Meilisearch documentation, "Errors" (reference/errors/overview) and "Error codes"
 * (reference/errors/error_codes). The wording of messages is ours or the service's; clients branch on the code.
 */
const codes = {
  bad_request: [400, "invalid_request"],
  document_not_found: [404, "invalid_request"],
  feature_not_enabled: [400, "invalid_request"],
  index_already_exists: [409, "invalid_request"],
  index_not_found: [404, "invalid_request"],
  index_primary_key_already_exists: [400, "invalid_request"],
  index_primary_key_multiple_candidates_found: [400, "invalid_request"],
  index_primary_key_no_candidate_found: [400, "invalid_request"],
  internal: [500, "internal"],
  invalid_api_key: [403, "auth"],
  invalid_content_type: [415, "invalid_request"],
  invalid_document_fields: [400, "invalid_request"],
  invalid_document_filter: [400, "invalid_request"],
  invalid_document_id: [400, "invalid_request"],
  invalid_document_limit: [400, "invalid_request"],
  invalid_document_offset: [400, "invalid_request"],
  invalid_index_limit: [400, "invalid_request"],
  invalid_index_offset: [400, "invalid_request"],
  invalid_index_primary_key: [400, "invalid_request"],
  invalid_index_uid: [400, "invalid_request"],
  invalid_search_attributes_to_retrieve: [400, "invalid_request"],
  invalid_search_attributes_to_search_on: [400, "invalid_request"],
  invalid_search_filter: [400, "invalid_request"],
  invalid_search_hits_per_page: [400, "invalid_request"],
  invalid_search_limit: [400, "invalid_request"],
  invalid_search_matching_strategy: [400, "invalid_request"],
  invalid_search_offset: [400, "invalid_request"],
  invalid_search_page: [400, "invalid_request"],
  invalid_search_q: [400, "invalid_request"],
  invalid_search_sort: [400, "invalid_request"],
  invalid_settings_displayed_attributes: [400, "invalid_request"],
  invalid_settings_filterable_attributes: [400, "invalid_request"],
  invalid_settings_pagination: [400, "invalid_request"],
  invalid_settings_ranking_rules: [400, "invalid_request"],
  invalid_settings_searchable_attributes: [400, "invalid_request"],
  invalid_settings_sortable_attributes: [400, "invalid_request"],
  invalid_settings_typo_tolerance: [400, "invalid_request"],
  invalid_task_limit: [400, "invalid_request"],
  invalid_task_statuses: [400, "invalid_request"],
  invalid_task_uids: [400, "invalid_request"],
  malformed_payload: [400, "invalid_request"],
  missing_authorization_header: [401, "auth"],
  missing_content_type: [415, "invalid_request"],
  missing_document_filter: [400, "invalid_request"],
  missing_document_id: [400, "invalid_request"],
  missing_index_uid: [400, "invalid_request"],
  missing_payload: [400, "invalid_request"],
  not_found: [404, "invalid_request"],
  payload_too_large: [413, "invalid_request"],
  task_not_found: [404, "invalid_request"],
} as const satisfies Record<string, readonly [number, string]>;

export type ErrorCode = keyof typeof codes;

export type ErrorBody = { message: string; code: string; type: string; link: string };

/** An answer the service documents as an error, thrown from wherever it is noticed. */
export class ApiError extends Error {
  readonly status: number;

  constructor(
    readonly code: ErrorCode,
    message: string,
  ) {
    super(message);
    this.status = codes[code][0];
  }

  toBody(): ErrorBody {
    const [, type] = codes[this.code];
    return {
      message: this.message,
      code: this.code,
      type,
      link: `https://docs.meilisearch.com/errors#${this.code}`,
    };
  }
}
