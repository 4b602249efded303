/**
 * What the user can do. One {@link tideband.window.action.Command} an action feeds its place in the menus, its key, its
 * button and its tooltip, so that none of them can disagree; what cannot be done now is greyed out and says why.
 */
package tideband.window.action;
