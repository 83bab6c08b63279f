package org.wellwright.project.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.wellwright.project.FileTrace;
import org.wellwright.project.Project;
import org.wellwright.project.file.JsonValue.JsonNumber;
import org.wellwright.project.file.JsonValue.JsonObject;
import org.wellwright.project.file.JsonValue.JsonText;
import org.wellwright.solver.model.DataGroup;
import org.wellwright.solver.model.Datum;
import org.wellwright.solver.model.LabelConvention;
import org.wellwright.solver.model.Model;
import org.wellwright.solver.model.ModelDocument;
import org.wellwright.solver.model.Parameter;
import org.wellwright.solver.model.Weighting;
import org.wellwright.solver.pair.PairSystem;

/** The root object of a project file, version 1. */
final class ProjectFormat {
    static final String FORMAT = "wellwright-project";
    static final int VERSION = 1;

    /**
     * What version 1 means where a file does not pin an edition; never changed, or old files would change their levels.
     */
    private static final String CONSTANTS = "CODATA 2022";

    private static final String MASSES = "CODATA 2022, AME 2020";

    private ProjectFormat() {}

    static Project read(ObjectIn in, ObjectIn.Reading reading) {
        if (!FORMAT.equals(in.text("format", ""))) {
            throw in.fault(
                    "format",
                    "this is not a Wellwright project: 'format' is not \"" + FORMAT + "\"",
                    "add \"format\": \"" + FORMAT + "\"");
        }
        int version = in.integer("version");
        if (version > VERSION) {
            throw in.fault(
                    "version",
                    "the file has format version " + version + ", this program reads up to " + VERSION,
                    "open it with a newer Wellwright");
        }
        if (version < 1) {
            throw in.fault("version", "the format version is " + version, "the first is 1");
        }
        in.knowing(
                "format",
                "version",
                "title",
                "constantsEdition",
                "massTable",
                "units",
                "labels",
                "weighting",
                "notes",
                "systems",
                "parameters",
                "models",
                "groups",
                "data",
                "views");
        List<PairSystem> systems = in.items("systems", "id", Integer::toString, SystemFormat::read);
        String only = systems.size() == 1 ? systems.get(0).id() : "";
        List<Parameter> parameters = in.items("parameters", "name", Integer::toString, ParameterFormat::read);
        List<Model> models = in.items("models", "name", Integer::toString, ModelFormat::read);
        List<DataGroup> groups = in.items("groups", "id", Integer::toString, DatumFormat::readGroup);
        List<Datum> data = in.items("data", "id", DatumFormat::unnamed, item -> DatumFormat.read(item, only));
        ModelDocument document = in.make(() -> new ModelDocument(
                in.text("constantsEdition", CONSTANTS),
                in.text("massTable", MASSES),
                in.text("units"),
                in.choice("labels", LabelConvention.class, LabelConvention.ATOMIC),
                in.choice("weighting", Weighting.class, Weighting.KNOWN),
                systems,
                parameters,
                models,
                data,
                groups));
        String title = in.text("title", "");
        String notes = in.text("notes", "");
        return new Project(title, document, notes, views(in), reading.trace());
    }

    private static Map<String, Map<String, String>> views(ObjectIn in) {
        Map<String, Map<String, String>> views = new LinkedHashMap<>();
        in.members("views").forEach((id, state) -> {
            Map<String, String> texts = new LinkedHashMap<>();
            Map<String, JsonValue> members = state instanceof JsonObject object ? object.members() : Map.of("", state);
            members.forEach((key, value) -> {
                if (!(value instanceof JsonText text)) {
                    throw in.fault(
                            "views",
                            "the view '" + id + "' is not an object of texts",
                            "remove it; the windows then start afresh");
                }
                texts.put(key, text.value());
            });
            views.put(id, texts);
        });
        return views;
    }

    static JsonObject write(Project project) {
        FileTrace trace = project.trace();
        ModelDocument document = project.document();
        String only = document.systems().size() == 1 ? document.systems().get(0).id() : "";
        int[] position = {0};
        ObjectOut out = new ObjectOut(trace, "");
        out.text("format", FORMAT)
                .put("version", JsonNumber.of(VERSION))
                .text("title", project.title(), "")
                .text("constantsEdition", document.constantsEdition())
                .text("massTable", document.massTable())
                .text("units", document.units())
                .choice("labels", document.labels(), LabelConvention.ATOMIC)
                .choice("weighting", document.weighting(), Weighting.KNOWN)
                .text("notes", project.notes(), "")
                .items("systems", document.systems(), PairSystem::id, SystemFormat::write)
                .items("parameters", document.parameters(), Parameter::name, ParameterFormat::write)
                .items("models", document.models(), Model::name, ModelFormat::write)
                .items("groups", document.groups(), DataGroup::id, DatumFormat::writeGroup)
                .items(
                        "data",
                        document.data(),
                        Datum::id,
                        (item, datum) -> DatumFormat.write(item, datum, DatumFormat.unnamed(position[0]++), only));
        Map<String, JsonValue> views = new LinkedHashMap<>();
        project.views().forEach((id, state) -> {
            Map<String, JsonValue> texts = new LinkedHashMap<>();
            state.forEach((key, text) -> texts.put(key, new JsonText(text)));
            views.put(id, new JsonObject(texts));
        });
        out.put("views", views.isEmpty() ? null : new JsonObject(views));
        return out.done();
    }
}
