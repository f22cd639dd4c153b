/** What is chosen on the stops page: one thing at a time. A face is named by its place among the strips. */
export interface Chosen {
  readonly kind: 'stop' | 'pass' | 'touch-point' | 'face';
  readonly id: string;
}
