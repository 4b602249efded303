/**
 * The drawing window: JavaFX lives here and nowhere else.
 *
 * <p>One folder a concept. A class named {@code …Model} decides: it holds JavaFX properties, knows no scene and no stage, and
 * is tested without a screen. A class named {@code …View} binds to a model, paints and passes on what hand and keyboard
 * do. {@link tideband.window.drawing} holds the drawing all share, {@link tideband.window.work} the plan worked out beside
 * it, {@link tideband.window.action} what the user can do.
 */
package tideband.window;
