/** What is wrong with one field, by its path such as `conditions.band.upper`. */
export interface FieldError {
  field: string;
  message: string;
}
