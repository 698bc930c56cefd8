package org.modewright.workspace;

import java.util.Arrays;
import org.eclipse.core.resources.ICommand;
import org.eclipse.core.resources.IProject;
import org.eclipse.core.resources.IProjectDescription;
import org.eclipse.core.resources.IProjectNature;
import org.eclipse.core.runtime.CoreException;

/** A project of structural models, which are checked whenever they change. */
public final class ModewrightNature implements IProjectNature {

    public static final String ID = "org.modewright.workspace.nature";

    /** The builder that checks the models and marks what it finds. */
    public static final String BUILDER = "org.modewright.workspace.builder";

    private IProject project;

    @Override
    public void configure() throws CoreException {
        IProjectDescription description = project.getDescription();
        ICommand[] commands = description.getBuildSpec();
        for (ICommand command : commands) {
            if (BUILDER.equals(command.getBuilderName())) {
                return;
            }
        }
        ICommand command = description.newCommand();
        command.setBuilderName(BUILDER);
        ICommand[] more = Arrays.copyOf(commands, commands.length + 1);
        more[commands.length] = command;
        description.setBuildSpec(more);
        project.setDescription(description, null);
    }

    @Override
    public void deconfigure() throws CoreException {
        IProjectDescription description = project.getDescription();
        ICommand[] others = Arrays.stream(description.getBuildSpec())
                .filter(command -> !BUILDER.equals(command.getBuilderName())).toArray(ICommand[]::new);
        description.setBuildSpec(others);
        project.setDescription(description, null);
    }

    @Override
    public IProject getProject() {
        return project;
    }

    @Override
    public void setProject(IProject value) {
        project = value;
    }
}
