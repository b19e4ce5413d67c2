/**
 * Units of measure, exact conversions, and guards for numbers.
 *
 * <p>Its nouns are {@link coilwright.unit.Dimension} and {@link coilwright.unit.Unit}. Imports no
 * other room.
 *
 * <p>It exists because everything inside is mm, N, MPa, kg/m^3, rad and Hz as plain numbers:
 * conversion happens where files are read and text is printed, by the factors that stand here and
 * nowhere else.
 */
package coilwright.unit;
