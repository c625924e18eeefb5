/**
 * How well does loose sand conduct water, judged by its grain size?
 *
 * <p>Read {@link connate.conductivity.Conductivity} first: every published formula side by side,
 * those outside their range marked, and the way between conductivity and permeability. The formulas
 * stand in one class each. None is for clay, for cemented rock or for compacted sand.
 */
package connate.conductivity;
