package coilwright.cli;

import coilwright.material.WireSeries;
import java.util.List;

/** Reads the name of a wire series. */
final class SeriesConverter extends WordConverter<WireSeries> {

  SeriesConverter() {
    super(List.of(WireSeries.values()), WireSeries::id);
  }
}
