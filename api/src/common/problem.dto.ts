/** RFC 9457 problem details: what every answer that is not a success carries. */
export class ProblemDto {
  /** Stable; opened, it explains itself. @example /problems/invalid-input */
  type: string;
  title: string;
  status: number;
  /** This occurrence, in words for a member. */
  detail: string;
  /** Names this request in the log. */
  instance: string;
  errors?: FieldProblemDto[];
}

export class FieldProblemDto {
  /** Where in the request. @example #/endsAt */
  pointer: string;
  detail: string;
}
