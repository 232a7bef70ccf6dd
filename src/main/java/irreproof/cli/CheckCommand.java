package irreproof.cli;

import irreproof.budget.Budget;
import irreproof.check.CheckOptions;
import irreproof.check.Checker;
import irreproof.check.FileReport;
import irreproof.check.Severity;
import irreproof.report.JsonReport;
import irreproof.report.TextReport;
import irreproof.text.SourceText;
import irreproof.workspace.FileCache;
import irreproof.workspace.FileCollector;
import irreproof.workspace.FileReading;
import irreproof.workspace.OpenDocuments;
import irreproof.workspace.ProjectSources;
import irreproof.workspace.SourceFile;
import irreproof.workspace.Version;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Model.OptionSpec;
import picocli.CommandLine.Model.PositionalParamSpec;
import picocli.CommandLine.ParseResult;

/** Checks files, folders or standard input, and prints one report. */
final class CheckCommand implements Subcommand {
    private static final String STANDARD_INPUT = "-";

    @Override
    public String name() {
        return "check";
    }

    @Override
    public String[] description() {
        return new String[] {
            "Checks every statement about representations in LaTeX sources.",
            "Exit code: 0 no errors, 1 some errors, 2 could not be done.",
            ""
        };
    }

    @Override
    public void declare(CommandSpec spec) {
        spec.addPositional(PositionalParamSpec.builder()
                .paramLabel("PATH")
                .required(true)
                .arity("1..*")
                .type(String[].class)
                .description("Files, folders (all .tex, .ltx and .latex files below), or - for standard input.")
                .build());
        spec.addOption(OptionSpec.builder("--format")
                .paramLabel("text|json")
                .type(String.class)
                .defaultValue("text")
                .description("How to print (default: text).")
                .build());
        spec.addOption(OptionSpec.builder("--output")
                .paramLabel("FILE")
                .type(String.class)
                .description("Print into a file.")
                .build());
        spec.addOption(Subcommand.group());
    }

    @Override
    public int run(ParseResult given, Console console) throws Exception {
        String format = given.matchedOptionValue("--format", "text");
        if (!format.equals("text") && !format.equals("json")) {
            throw new UserError("--format is text or json, not " + format);
        }
        List<Callable<FileReport>> tasks = tasks(given, console);
        List<FileReport> reports = DeepStack.runAll(tasks);
        String printed = format.equals("json") ? JsonReport.print(reports, Version.text()) : TextReport.print(reports);
        String output = given.matchedOptionValue("--output", "");
        if (output.isEmpty()) {
            console.print(printed);
        } else {
            write(output, printed);
        }
        return reports.stream().anyMatch(CheckCommand::hasError) ? ExitCode.FOUND_ERRORS : ExitCode.CLEAN;
    }

    private static List<Callable<FileReport>> tasks(ParseResult given, Console console) throws Exception {
        String group = given.matchedOptionValue("--group", "");
        Optional<String> problem = Checker.problemWithGroup(group);
        if (problem.isPresent()) {
            throw new UserError("--group: " + problem.get());
        }
        FileCache included = new FileCache();
        List<Callable<FileReport>> tasks = new ArrayList<>();
        List<String> paths = new ArrayList<>(List.of(given.matchedPositionalValue(0, new String[0])));
        if (paths.removeIf(STANDARD_INPUT::equals)) {
            SourceText typed = FileReading.read(console.in(), STANDARD_INPUT);
            tasks.add(() -> check(typed, group, included));
        }
        for (SourceFile source : FileCollector.collect(paths)) {
            tasks.add(() -> check(FileReading.read(source.file(), source.shown()), group, included));
        }
        return tasks;
    }

    private static FileReport check(SourceText source, String group, FileCache included) {
        ProjectSources sources = new ProjectSources(source, OpenDocuments.none(), included);
        return Checker.check(
                source, new CheckOptions(group, sources, CheckOptions.DEFAULT_STEPS, false), Budget.unlimited());
    }

    private static boolean hasError(FileReport report) {
        return report.allFindings().stream().anyMatch(finding -> finding.severity() == Severity.ERROR);
    }

    private static void write(String output, String report) throws UserError {
        try {
            Files.write(Path.of(output), report.getBytes(StandardCharsets.UTF_8));
        } catch (IOException e) {
            throw new UserError("the report could not be written to " + output);
        }
    }
}
