package coilwright.problem;

import coilwright.material.Supply;
import coilwright.material.WireSeries;
import coilwright.material.WireSize;
import coilwright.spring.EndType;
import coilwright.spring.Hand;
import coilwright.spring.Rounding;
import java.util.List;

/**
 * What a shop may make the spring of, and how.
 *
 * @param supply whose grades are offered where none is named
 * @param materials ids named in the file, catalogue's and own; empty where none is named
 * @param allMaterials whether the file says {@code all}
 * @param excludeMaterials ids never tried
 * @param wireSeries series named in the file; empty where none is
 * @param wireSizes explicit sizes; empty where none is given. They take the place of series
 * @param ends the end types tried; none for the other kinds than compression springs
 * @param hand direction of winding
 * @param setRemoved whether a compression spring is pressed solid once before use
 * @param coating thickness of what covers the wire [mm], zero for bare wire
 * @param coilStep active coils are multiples of this, body coils for the other kinds [-]; unused
 *     where the legs' angle fixes the fraction of a coil
 * @param rounding steps of mean diameter and free length
 */
public record Make(
    Supply supply,
    List<String> materials,
    boolean allMaterials,
    List<String> excludeMaterials,
    List<WireSeries> wireSeries,
    List<WireSize> wireSizes,
    List<EndType> ends,
    Hand hand,
    boolean setRemoved,
    double coating,
    double coilStep,
    Rounding rounding) {

  /** Copies the lists. */
  public Make {
    materials = List.copyOf(materials);
    excludeMaterials = List.copyOf(excludeMaterials);
    wireSeries = List.copyOf(wireSeries);
    wireSizes = List.copyOf(wireSizes);
    ends = List.copyOf(ends);
  }
}
