package tideband.window;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;
import org.junit.jupiter.api.extension.ExtendWith;
import org.testfx.framework.junit5.ApplicationExtension;

/**
 * A test in a real scene, on a screen in memory. Give the class a method with {@code @Start} that shows a stage; its tests
 * may take a {@code FxRobot}.
 */
@Target(ElementType.TYPE)
@Retention(RetentionPolicy.RUNTIME)
@ExtendWith({TextLibrary.class, ApplicationExtension.class})
public @interface ScreenTest {}
