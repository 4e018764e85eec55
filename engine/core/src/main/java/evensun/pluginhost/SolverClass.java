package evensun.pluginhost;

import evensun.spi.OpticalSolver;
import evensun.spi.Traits;
import java.lang.reflect.Constructor;
import java.lang.reflect.InvocationTargetException;
import java.lang.reflect.Modifier;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * From the name that a plugin declares to a solver, with every way this can fail told apart.
 *
 * @param name the declared class name
 * @param loader the plugin's class loader
 */
record SolverClass(String name, ClassLoader loader) {

  private static final Pattern ID = Pattern.compile("[a-z][a-z0-9-]*");
  private static final Pattern CLASS_FILE_VERSION = Pattern.compile("class file version (\\d+)");

  /** Class files of Java N carry version N + 44. */
  private static final int CLASS_FILE_OFFSET = 44;

  /** The solver, and what it said about itself when asked once. */
  record Made(OpticalSolver solver, String id, Traits traits) {}

  Made make() throws Rejection {
    try {
      OpticalSolver solver = construct(load());
      return new Made(solver, checkedId(solver), checkedTraits(solver));
    } catch (LinkageError e) {
      throw linkage(e);
    }
  }

  private Class<?> load() throws Rejection {
    try {
      return Class.forName(name, false, loader);
    } catch (ClassNotFoundException e) {
      throw new Rejection(
          "class-absent",
          SolverFinder.SERVICE_FILE + " names " + name + ", which is not in the plugin",
          "correct the name, or rebuild the plugin");
    }
  }

  private OpticalSolver construct(Class<?> type) throws Rejection {
    if (!OpticalSolver.class.isAssignableFrom(type)) {
      throw wrongClass(
          "class-not-a-solver",
          "does not implement evensun.spi.OpticalSolver",
          "implement it, or name the class that does");
    }
    if (Modifier.isAbstract(type.getModifiers())) {
      throw wrongClass(
          "class-abstract", "is abstract", "name a class that can be made in " + serviceFile());
    }
    if (!Modifier.isPublic(type.getModifiers())) {
      throw wrongClass("class-not-public", "is not public", "make the class public");
    }
    return (OpticalSolver) construct(constructor(type));
  }

  private Constructor<?> constructor(Class<?> type) throws Rejection {
    try {
      return type.getConstructor();
    } catch (NoSuchMethodException e) {
      throw wrongClass(
          "constructor-missing",
          "has no public constructor without arguments",
          "add one; an inner class must be static");
    }
  }

  private Object construct(Constructor<?> constructor) throws Rejection {
    try {
      return constructor.newInstance();
    } catch (InvocationTargetException e) {
      throw threw("its constructor", e.getCause());
    } catch (ReflectiveOperationException e) {
      throw wrongClass(
          "constructor-missing", "cannot be made (" + OneLine.of(e) + ")", "see there");
    }
  }

  private String checkedId(OpticalSolver solver) throws Rejection {
    String id;
    try {
      id = solver.id();
    } catch (RuntimeException e) {
      throw threw("id()", e);
    }
    if (id == null || !ID.matcher(id).matches()) {
      throw wrongClass(
          "solver-id-malformed",
          "calls itself " + (id == null ? "null" : "\"" + id + "\""),
          "an id consists of lower-case letters, digits and hyphens and starts with a letter");
    }
    return id;
  }

  private Traits checkedTraits(OpticalSolver solver) throws Rejection {
    Traits traits;
    try {
      traits = solver.traits();
    } catch (RuntimeException e) {
      throw threw("traits()", e);
    }
    if (traits == null) {
      throw wrongClass("traits-missing", "returns no traits", "return Traits.plain() at least");
    }
    return traits;
  }

  private Rejection threw(String where, Throwable thrown) {
    if (thrown instanceof LinkageError e) {
      return linkage(e);
    }
    return new Rejection(
        where.endsWith("()") ? "solver-threw" : "constructor-threw",
        name + ": " + where + " threw " + OneLine.of(thrown),
        "correct the plugin; a solver must be made without files, options or a problem at hand");
  }

  private Rejection linkage(LinkageError e) {
    if (e instanceof UnsupportedClassVersionError) {
      return newerJava(e);
    }
    if (e instanceof UnsatisfiedLinkError) {
      return new Rejection(
          "native-library-missing",
          "it needs a native library that cannot be loaded (" + OneLine.of(e) + ")",
          "install the library for this system, or start Java with its folder in java.library.path");
    }
    if (e instanceof ExceptionInInitializerError && e.getCause() != null) {
      return threw("its static initialiser", e.getCause());
    }
    if (e instanceof NoClassDefFoundError) {
      return new Rejection(
          "dependency-missing",
          "it needs class " + className(e.getMessage()) + ", which it does not bring along",
          "put the library into the plugin's lib folder, or its classes into the plugin's jar;"
              + " plugins do not see Evensun's own libraries");
    }
    return new Rejection(
        "linkage", "its classes do not fit together (" + OneLine.of(e) + ")", "rebuild the plugin");
  }

  private static Rejection newerJava(LinkageError e) {
    Matcher version = CLASS_FILE_VERSION.matcher(String.valueOf(e.getMessage()));
    String made =
        version.find() ? "" + (Integer.parseInt(version.group(1)) - CLASS_FILE_OFFSET) : "a newer";
    int running = Runtime.version().feature();
    return new Rejection(
        "newer-java",
        "it was compiled for Java " + made + ", this is Java " + running,
        "start Evensun with Java " + made + ", or compile the plugin with --release " + running);
  }

  private static String className(String message) {
    return String.valueOf(message).replace('/', '.');
  }

  private Rejection wrongClass(String code, String what, String remedy) {
    return new Rejection(code, "declared solver " + name + " " + what, remedy);
  }

  private static String serviceFile() {
    return SolverFinder.SERVICE_FILE;
  }
}
