package sillet.command;

import java.io.IOException;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileSystemException;
import java.nio.file.NoSuchFileException;
import picocli.CommandLine;
import picocli.CommandLine.IExecutionExceptionHandler;
import picocli.CommandLine.IParameterExceptionHandler;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import sillet.logbook.text.Message;
import sillet.logbook.text.Rejection;
import sillet.sheets.csv.Remark;
import sillet.sheets.csv.SheetRefused;
import sillet.store.engine.LogbookProblem;
import sillet.store.engine.ProblemKind;

/** The one place where trouble becomes a sentence and an exit code. */
final class Failures implements IExecutionExceptionHandler, IParameterExceptionHandler {
  private final Terminal terminal;

  Failures(Terminal terminal) {
    this.terminal = terminal;
  }

  @Override
  public int handleParseException(ParameterException trouble, String[] args) {
    terminal.err().println(trouble.getMessage());
    String command = trouble.getCommandLine().getCommandSpec().qualifiedName();
    terminal.say(Message.of("command.help-hint", command));
    return ExitCodes.BAD_INPUT;
  }

  @Override
  public int handleExecutionException(
      Exception trouble, CommandLine commandLine, ParseResult parsed) {
    if (trouble instanceof SheetRefused refused) {
      return refused(refused);
    }
    if (trouble instanceof Rejection rejection) {
      terminal.say(rejection.reason());
      return ExitCodes.BAD_INPUT;
    }
    if (trouble instanceof LogbookProblem problem) {
      terminal.say(problem.reason());
      return code(problem.kind());
    }
    if (trouble instanceof IOException failed) {
      return notWritten(failed);
    }
    return unexpected(trouble);
  }

  private static int code(ProblemKind kind) {
    return switch (kind) {
      case NO_SUCH, BAD_PLACE, EXISTS -> ExitCodes.BAD_INPUT;
      case IN_USE -> ExitCodes.LOGBOOK_BUSY;
      case DAMAGED, NEWER, UNREADABLE_ACTION -> ExitCodes.LOGBOOK_UNFIT;
      case READ_ONLY, DISK, NOT_CERTAIN -> ExitCodes.TROUBLE_WRITING;
      case CONFLICT, NOT_THERE, TOO_LONG, CLOSED, UNEXPECTED -> ExitCodes.ANYTHING_ELSE;
    };
  }

  private int refused(SheetRefused refused) {
    for (Remark reason : refused.reasons()) {
      terminal.err().println(reason.said(terminal.texts()));
    }
    terminal.more(refused.more());
    return ExitCodes.BAD_INPUT;
  }

  private int notWritten(IOException failed) {
    if (failed instanceof DataStream.Closed closed) {
      if (terminal.readerIsGone(closed)) {
        return ExitCodes.DONE;
      }
      terminal.say(Message.of("command.output-failed", String.valueOf(failed.getMessage())));
    } else {
      terminal.say(Message.of("command.write-failed", reason(failed)));
    }
    return ExitCodes.TROUBLE_WRITING;
  }

  private String reason(IOException failed) {
    if (failed instanceof FileSystemException onFile) {
      String file = String.valueOf(onFile.getFile());
      if (failed instanceof NoSuchFileException) {
        return terminal.texts().say("command.no-folder", file);
      }
      if (failed instanceof AccessDeniedException) {
        return terminal.texts().say("command.no-permission", file);
      }
    }
    return String.valueOf(failed.getMessage());
  }

  private int unexpected(Exception trouble) {
    StackTraceElement[] trace = trouble.getStackTrace();
    String where = trace.length == 0 ? "" : trace[0].toString();
    terminal.say(Message.of("command.unexpected", trouble.toString(), where));
    return ExitCodes.ANYTHING_ELSE;
  }
}
