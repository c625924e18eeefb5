/**
 * What does a column or curve stand for? {@link connate.role.Roles} knows the names and units under
 * which the trade writes depth, gamma ray, porosity, permeability and so on; a workbook can add its
 * own. Read the list itself: {@code connate/role/roles.txt} in the resources.
 */
package connate.role;
