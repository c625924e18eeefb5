/**
 * How much pore space did burial squeeze out?
 *
 * <p>Read {@link connate.compaction.SclaterChristie} first: porosity with depth of the common
 * rocks. {@link connate.compaction.EffectiveStress} and {@link connate.compaction.LanderWalderhaug}
 * hold under overpressure too; {@link connate.compaction.CompactionLoss} tells from a thin section
 * what compaction and what cement took; {@link connate.compaction.Decompaction} takes a bed back to
 * where it was.
 */
package connate.compaction;
