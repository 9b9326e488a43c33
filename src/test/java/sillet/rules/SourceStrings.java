package sillet.rules;

import com.sun.source.tree.CompilationUnitTree;
import com.sun.source.tree.ExpressionTree;
import com.sun.source.tree.IdentifierTree;
import com.sun.source.tree.LiteralTree;
import com.sun.source.tree.MemberSelectTree;
import com.sun.source.tree.MethodInvocationTree;
import com.sun.source.tree.Tree;
import com.sun.source.util.JavacTask;
import com.sun.source.util.TreeScanner;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Stream;
import javax.tools.JavaCompiler;
import javax.tools.StandardJavaFileManager;
import javax.tools.ToolProvider;

/**
 * The string literals of Java sources, read by the compiler's own parser: comments do not count.
 */
final class SourceStrings extends TreeScanner<Void, Void> {
  private static final Set<String> MESSAGES = Set.of("Message", "Rejection");

  private final Set<String> all = new TreeSet<>();
  private final Set<String> said = new TreeSet<>();
  private final List<String> gluedKeys = new ArrayList<>();

  private SourceStrings() {}

  static SourceStrings of(Path sources) throws IOException {
    SourceStrings strings = new SourceStrings();
    JavaCompiler compiler = ToolProvider.getSystemJavaCompiler();
    try (Stream<Path> walk = Files.walk(sources);
        StandardJavaFileManager files =
            compiler.getStandardFileManager(null, Locale.ROOT, StandardCharsets.UTF_8)) {
      List<Path> java = walk.filter(path -> path.toString().endsWith(".java")).sorted().toList();
      JavacTask task =
          (JavacTask)
              compiler.getTask(
                  null,
                  files,
                  null,
                  List.of("-proc:none"),
                  null,
                  files.getJavaFileObjectsFromPaths(java));
      for (CompilationUnitTree unit : task.parse()) {
        strings.scan(unit, null);
      }
    }
    return strings;
  }

  /** Every literal. */
  Set<String> all() {
    return all;
  }

  /** Every literal handed over as a key: to {@code say} or to a message. */
  Set<String> said() {
    return said;
  }

  /** Calls whose key is put together on the spot. */
  List<String> gluedKeys() {
    return gluedKeys;
  }

  @Override
  public Void visitLiteral(LiteralTree literal, Void nothing) {
    if (literal.getValue() instanceof String text) {
      all.add(text);
    }
    return super.visitLiteral(literal, null);
  }

  @Override
  public Void visitMethodInvocation(MethodInvocationTree call, Void nothing) {
    if (!call.getArguments().isEmpty() && takesKey(call.getMethodSelect())) {
      ExpressionTree key = call.getArguments().get(0);
      if (key instanceof LiteralTree literal) {
        said.add(String.valueOf(literal.getValue()));
      } else if (key.getKind() == Tree.Kind.PLUS) {
        gluedKeys.add(call.toString());
      }
    }
    return super.visitMethodInvocation(call, null);
  }

  private static boolean takesKey(ExpressionTree method) {
    if (method instanceof MemberSelectTree member) {
      String name = member.getIdentifier().toString();
      return name.equals("say")
          || (name.equals("of") && MESSAGES.contains(member.getExpression().toString()));
    }
    return method instanceof IdentifierTree name && name.getName().contentEquals("say");
  }
}
