package tideband.edit;

import java.util.List;
import java.util.Optional;
import tideband.colour.Illuminant;
import tideband.colour.Observer;
import tideband.design.Band;
import tideband.design.BenchTimes;
import tideband.design.Design;
import tideband.design.Holding;
import tideband.design.Order;
import tideband.design.PullSettings;
import tideband.optics.Finish;
import tideband.oxide.Bath;
import tideband.oxide.Metal;
import tideband.oxide.Supply;
import tideband.piece.Piece;
import tideband.piece.Vessel;

/** A design taken apart, some of it to be replaced, and put together again. */
final class Draft {
    String title;
    Metal metal;
    Finish finish;
    Illuminant light;
    Observer observer;
    Piece piece;
    Holding holding;
    List<Band> bands;
    Bath bath;
    Optional<String> bathFile;
    Supply supply;
    Optional<Vessel> vessel;
    BenchTimes bench;
    Order order;
    PullSettings pull;

    Draft(Design design) {
        title = design.title();
        metal = design.metal();
        finish = design.finish();
        light = design.light();
        observer = design.observer();
        piece = design.piece();
        holding = design.holding();
        bands = design.bands();
        bath = design.bath();
        bathFile = design.bathFile();
        supply = design.supply();
        vessel = design.vessel();
        bench = design.bench();
        order = design.order();
        pull = design.pull();
    }

    Design design() {
        return new Design(
                title, metal, finish, light, observer, piece, holding, bands, bath, bathFile, supply, vessel, bench,
                order, pull);
    }
}
